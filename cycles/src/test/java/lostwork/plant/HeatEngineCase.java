package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lostwork.component.Compressor;
import lostwork.component.Cooler;
import lostwork.component.Heater;
import lostwork.component.Mixer;
import lostwork.component.Pump;
import lostwork.component.Splitter;
import lostwork.component.Turbine;
import lostwork.component.Valve;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.quantity.MassFlow;
import lostwork.quantity.MolarMass;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.Temperature;

/**
 * A closed plant between two reservoirs, drawn at random but feasible: gas and steam engines, refrigerators and heat pumps.
 * The order in which its parts are added can be shuffled.
 *
 * @param specification the plant with everything given
 * @param fromHot the ports where heat enters or leaves at the hot reservoir
 * @param fromCold the ports at the cold reservoir
 * @param hot the temperature of the hot reservoir
 * @param cold the temperature of the cold reservoir
 * @param net the power that the plant delivers, negative when it takes power
 */
record HeatEngineCase(
        Specification specification,
        List<HeatPort> fromHot,
        List<HeatPort> fromCold,
        Temperature hot,
        Temperature cold,
        Variable<Power> net) {
    private static final Fluid WATER = Water.industrial();
    private static final Fluid AIR = DryAir.standard();
    private static final Fluid HELIUM =
            PerfectGas.of("helium", MolarMass.gramsPerMole(4.0026), SpecificHeatCapacity.joulesPerKilogramKelvin(5193));

    /** Draws an engine. */
    static HeatEngineCase engine(SplittableRandom random, SplittableRandom order) {
        return switch (random.nextInt(4)) {
            case 0 -> gasEngine(random, order, AIR);
            case 1 -> gasEngine(random, order, HELIUM);
            case 2 -> steamEngine(random, order, random.nextBoolean());
            default -> regenerativeSteamEngine(random, order);
        };
    }

    /** Draws a refrigerator or heat pump. */
    static HeatEngineCase refrigerator(SplittableRandom random, SplittableRandom order) {
        return random.nextBoolean() ? gasRefrigerator(random, order) : vapourRefrigerator(random, order);
    }

    /** Adds and connects parts in a shuffled order. */
    private static final class Parts {
        private final Plant.Builder builder = Plant.builder("plant");
        private final List<Runnable> actions = new ArrayList<>();

        <C extends Component> C add(C component) {
            actions.add(() -> builder.add(component));
            return component;
        }

        void connect(Outlet from, Inlet to) {
            actions.add(() -> builder.connect(from, to));
        }

        void line(FlowPath... paths) {
            for (int i = 1; i < paths.length; i++) {
                connect(paths[i - 1].outlet(), paths[i].inlet());
            }
        }

        void loop(Fluid fluid, FlowPath... paths) {
            line(paths);
            connect(paths[paths.length - 1].outlet(), paths[0].inlet());
            actions.add(() -> builder.medium(paths[0].inlet(), fluid));
        }

        Plant build(SplittableRandom order) {
            for (int i = actions.size() - 1; i > 0; i--) {
                final int k = order.nextInt(i + 1);
                final Runnable held = actions.get(i);
                actions.set(i, actions.get(k));
                actions.set(k, held);
            }
            actions.forEach(Runnable::run);
            return builder.build();
        }
    }

    private static double draw(SplittableRandom random, double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    private static HeatEngineCase gasEngine(SplittableRandom random, SplittableRandom order, Fluid gas) {
        final Parts parts = new Parts();
        final Compressor compressor = parts.add(new Compressor("compressor"));
        final Heater heater = parts.add(new Heater("heater"));
        final Turbine turbine = parts.add(new Turbine("turbine"));
        final Cooler cooler = parts.add(new Cooler("cooler"));
        parts.loop(gas, compressor, heater, turbine, cooler);
        final Variable<Power> net =
                parts.builder.define("net power", Power.KIND, turbine.power().minus(compressor.power()));
        final double cold = draw(random, 260, 320);
        final double hot = draw(random, 900, 1600);
        final double ratio = draw(random, 1.5, gas == HELIUM ? 5 : 25);
        final double low = draw(random, 0.5e5, 20e5);
        final Specification s = parts.build(order)
                .specify()
                .given(compressor.inlet().pressure(), Pressure.pascal(low))
                .given(compressor.inlet().temperature(), Temperature.kelvin(cold))
                .given(compressor.outlet().pressure(), Pressure.pascal(low * ratio))
                .given(turbine.inlet().temperature(), Temperature.kelvin(hot))
                .given(compressor.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(turbine.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(compressor.inlet().flow(), MassFlow.kilogramsPerSecond(draw(random, 0.1, 200)))
                .given(heater.heat().temperature(), Temperature.kelvin(hot))
                .given(cooler.heat().temperature(), Temperature.kelvin(cold));
        return new HeatEngineCase(
                s,
                List.of(heater.heat()),
                List.of(cooler.heat()),
                Temperature.kelvin(hot),
                Temperature.kelvin(cold),
                net);
    }

    private static HeatEngineCase steamEngine(SplittableRandom random, SplittableRandom order, boolean reheated) {
        final Parts parts = new Parts();
        final Pump pump = parts.add(new Pump("pump"));
        final Heater boiler = parts.add(new Heater("boiler"));
        final Turbine high = parts.add(new Turbine("high-pressure turbine"));
        final Cooler condenser = parts.add(new Cooler("condenser"));
        final double live = draw(random, 10e5, 150e5);
        final double back = draw(random, 0.04e5, 1e5);
        final double hot = draw(random, 700, 870);
        final double cold = WATER.model().saturation().temperature(back) - draw(random, 0.1, 15);
        if (!reheated) {
            parts.loop(WATER, pump, boiler, high, condenser);
            final Variable<Power> net =
                    parts.builder.define("net power", Power.KIND, high.power().minus(pump.power()));
            final Specification s = common(random, parts.build(order), pump, boiler, high, condenser, live, back, hot)
                    .given(condenser.heat().temperature(), Temperature.kelvin(cold));
            return new HeatEngineCase(
                    s,
                    List.of(boiler.heat()),
                    List.of(condenser.heat()),
                    Temperature.kelvin(hot),
                    Temperature.kelvin(cold),
                    net);
        }
        final Heater reheater = parts.add(new Heater("reheater"));
        final Turbine low = parts.add(new Turbine("low-pressure turbine"));
        parts.loop(WATER, pump, boiler, high, reheater, low, condenser);
        final Variable<Power> net = parts.builder.define(
                "net power", Power.KIND, high.power().plus(low.power()).minus(pump.power()));
        final Specification s = common(random, parts.build(order), pump, boiler, high, condenser, live, back, hot)
                .given(condenser.heat().temperature(), Temperature.kelvin(cold))
                .given(reheater.inlet().pressure(), Pressure.pascal(Math.sqrt(live * back) * draw(random, 0.5, 2)))
                .given(reheater.outlet().temperature(), Temperature.kelvin(hot - draw(random, 0, 50)))
                .given(low.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(reheater.heat().temperature(), Temperature.kelvin(hot));
        return new HeatEngineCase(
                s,
                List.of(boiler.heat(), reheater.heat()),
                List.of(condenser.heat()),
                Temperature.kelvin(hot),
                Temperature.kelvin(cold),
                net);
    }

    private static Specification common(
            SplittableRandom random,
            Plant plant,
            Pump pump,
            Heater boiler,
            Turbine high,
            Cooler condenser,
            double live,
            double back,
            double hot) {
        return plant.specify()
                .given(high.inlet().pressure(), Pressure.pascal(live))
                .given(high.inlet().temperature(), Temperature.kelvin(hot))
                .given(condenser.outlet().pressure(), Pressure.pascal(back))
                .given(condenser.outlet().vapourFraction(), Ratio.fraction(0))
                .given(high.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(pump.isentropicEfficiency(), Ratio.fraction(draw(random, 0.5, 1)))
                .given(boiler.inlet().flow(), MassFlow.kilogramsPerSecond(draw(random, 0.1, 100)))
                .given(boiler.heat().temperature(), Temperature.kelvin(hot));
    }

    /** With extraction between the turbines and an open feedwater heater. */
    private static HeatEngineCase regenerativeSteamEngine(SplittableRandom random, SplittableRandom order) {
        final Parts parts = new Parts();
        final Heater boiler = parts.add(new Heater("boiler"));
        final Turbine high = parts.add(new Turbine("high-pressure turbine"));
        final Splitter extraction = parts.add(new Splitter("extraction"));
        final Turbine low = parts.add(new Turbine("low-pressure turbine"));
        final Cooler condenser = parts.add(new Cooler("condenser"));
        final Pump condensate = parts.add(new Pump("condensate pump"));
        final Mixer heater = parts.add(new Mixer("feedwater heater"));
        final Pump feed = parts.add(new Pump("feed pump"));
        parts.line(feed, boiler, high, extraction.path(1), low, condenser, condensate, heater.path(1));
        parts.connect(extraction.outlet(2), heater.inlet(2));
        parts.connect(heater.outlet(), feed.inlet());
        parts.actions.add(() -> parts.builder.medium(feed.inlet(), WATER));
        final Variable<Power> net = parts.builder.define(
                "net power",
                Power.KIND,
                high.power().plus(low.power()).minus(feed.power()).minus(condensate.power()));
        final double live = draw(random, 30e5, 150e5);
        final double back = draw(random, 0.04e5, 0.3e5);
        final double hot = draw(random, 750, 870);
        final double cold = WATER.model().saturation().temperature(back) - draw(random, 0.1, 15);
        final Specification s = common(random, parts.build(order), feed, boiler, high, condenser, live, back, hot)
                .given(condenser.heat().temperature(), Temperature.kelvin(cold))
                .given(heater.outlet().pressure(), Pressure.pascal(Math.sqrt(live * back) * draw(random, 0.5, 2)))
                .given(heater.outlet().vapourFraction(), Ratio.fraction(0))
                .given(low.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(condensate.isentropicEfficiency(), Ratio.fraction(draw(random, 0.5, 1)));
        return new HeatEngineCase(
                s,
                List.of(boiler.heat()),
                List.of(condenser.heat()),
                Temperature.kelvin(hot),
                Temperature.kelvin(cold),
                net);
    }

    private static HeatEngineCase gasRefrigerator(SplittableRandom random, SplittableRandom order) {
        final Parts parts = new Parts();
        final Compressor compressor = parts.add(new Compressor("compressor"));
        final Cooler hotSide = parts.add(new Cooler("hot side"));
        final Turbine expander = parts.add(new Turbine("expander"));
        final Heater coldSide = parts.add(new Heater("cold side"));
        parts.loop(HELIUM, compressor, hotSide, expander, coldSide);
        final Variable<Power> net =
                parts.builder.define("net power", Power.KIND, expander.power().minus(compressor.power()));
        final double cold = draw(random, 240, 290);
        final double hot = draw(random, 295, 330);
        final double low = draw(random, 1e5, 5e5);
        final double ratio = draw(random, 1.5, 3) * Math.pow(hot / cold, 2.5);
        final Specification s = parts.build(order)
                .specify()
                .given(compressor.inlet().pressure(), Pressure.pascal(low))
                .given(compressor.inlet().temperature(), Temperature.kelvin(cold))
                .given(compressor.outlet().pressure(), Pressure.pascal(low * ratio))
                .given(expander.inlet().temperature(), Temperature.kelvin(hot))
                .given(compressor.isentropicEfficiency(), Ratio.fraction(draw(random, 0.7, 1)))
                .given(expander.isentropicEfficiency(), Ratio.fraction(draw(random, 0.8, 1)))
                .given(compressor.inlet().flow(), MassFlow.kilogramsPerSecond(draw(random, 0.1, 20)))
                .given(hotSide.heat().temperature(), Temperature.kelvin(hot))
                .given(coldSide.heat().temperature(), Temperature.kelvin(cold));
        return new HeatEngineCase(
                s,
                List.of(hotSide.heat()),
                List.of(coldSide.heat()),
                Temperature.kelvin(hot),
                Temperature.kelvin(cold),
                net);
    }

    /** Water as its own refrigerant. */
    private static HeatEngineCase vapourRefrigerator(SplittableRandom random, SplittableRandom order) {
        final Parts parts = new Parts();
        final Compressor compressor = parts.add(new Compressor("compressor"));
        final Cooler condenser = parts.add(new Cooler("condenser"));
        final Valve valve = parts.add(new Valve("valve"));
        final Heater evaporator = parts.add(new Heater("evaporator"));
        parts.loop(WATER, compressor, condenser, valve, evaporator);
        final Variable<Power> net = parts.builder.define(
                "net power", Power.KIND, Expression.constant(Power.watts(0)).minus(compressor.power()));
        final double evaporation = draw(random, 278, 330);
        final double condensation = evaporation + draw(random, 15, 60);
        final double cold = evaporation + draw(random, 0, 5);
        final double hot = condensation - draw(random, 0, 5);
        final Specification s = parts.build(order)
                .specify()
                .given(evaporator.outlet().temperature(), Temperature.kelvin(evaporation))
                .given(evaporator.outlet().vapourFraction(), Ratio.fraction(1))
                .given(condenser.outlet().temperature(), Temperature.kelvin(condensation))
                .given(condenser.outlet().vapourFraction(), Ratio.fraction(0))
                .given(compressor.isentropicEfficiency(), Ratio.fraction(draw(random, 0.6, 1)))
                .given(evaporator.duty(), Power.kilowatts(draw(random, 10, 2000)))
                .given(condenser.heat().temperature(), Temperature.kelvin(hot))
                .given(evaporator.heat().temperature(), Temperature.kelvin(cold));
        return new HeatEngineCase(
                s,
                List.of(condenser.heat()),
                List.of(evaporator.heat()),
                Temperature.kelvin(hot),
                Temperature.kelvin(cold),
                net);
    }
}
