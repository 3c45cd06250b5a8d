package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.megapascal;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.water.Water;
import lostwork.plant.Expression;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import org.junit.jupiter.api.Test;

/**
 * Steam cycles: saturated steam, reheat, one open feedwater heater.
 *
 * <p>Sources: Moran, Shapiro, Fundamentals of Engineering Thermodynamics, chapter 8, examples 8.1, 8.3 and 8.5; Çengel,
 * Boles, Thermodynamics: An Engineering Approach, chapter 10, example 10-4 (these from memory); the reheat example of the
 * textbook by Van Wylen, Sonntag and Borgnakke, as worked again in a published note of 2020.
 *
 * <p>Tolerances: half a unit of the last printed digit, and beside it what the steam tables and the rounding of the books
 * cost. They take the saturation tables of an older formulation to 0.1 kJ/kg, three digits of entropy differences, and the
 * pump work as v Δp; each check states the room it takes, in the unit of the value.
 */
class SteamCycleTableTest {
    /** A steam cycle with a defined net power. */
    private record Cycle(
            Heater boiler, Turbine turbine, Cooler condenser, Pump pump, Plant plant, Variable<Power> net) {
        static Cycle simple() {
            final var b = Plant.builder("steam cycle");
            final var boiler = b.add(new Heater("boiler"));
            final var turbine = b.add(new Turbine("turbine"));
            final var condenser = b.add(new Cooler("condenser"));
            final var pump = b.add(new Pump("pump"));
            b.circuit(Water.industrial(), boiler, turbine, condenser, pump);
            final var net = b.define("net power", Power.KIND, turbine.power().minus(pump.power()));
            return new Cycle(boiler, turbine, condenser, pump, b.build(), net);
        }
    }

    /** Saturated steam of 8 MPa, condenser 0.008 MPa, 100 MW net. */
    @Test
    void moranShapiroExample8Point1() {
        final Cycle c = Cycle.simple();
        final Solution s = c.plant()
                .specify()
                .given(c.turbine().inlet().pressure(), megapascal(8))
                .given(c.turbine().inlet().vapourFraction(), percent(100))
                .given(c.condenser().outlet().pressure(), megapascal(0.008))
                .given(c.condenser().outlet().vapourFraction(), percent(0))
                .given(c.turbine().isentropicEfficiency(), percent(100))
                .given(c.pump().isentropicEfficiency(), percent(100))
                .given(c.net(), Power.megawatts(100))
                .solve();
        final double heat = s.value(c.boiler().duty()).inMegawatts();
        BookValue.of("37.1").assertMatches(100 * 100 / heat, "thermal efficiency in %");
        BookValue.of("0.84")
                .assertMatches(
                        100
                                * s.value(c.pump().power()).inWatts()
                                / s.value(c.turbine().power()).inWatts(),
                        "back work ratio in %");
        BookValue.of("269.77").assertMatches(heat, 0.10, "heat input in MW");
        BookValue.of("169.75").assertMatches(s.value(c.condenser().duty()).inMegawatts(), 0.10, "heat rejected in MW");
        BookValue.of("3.77e5")
                .assertMatches(s.value(c.boiler().inlet().flow()).inKilogramsPerSecond() * 3600, "steam flow in kg/h");
        BookValue.of("0.6745")
                .assertMatches(s.value(c.turbine().outlet().vapourFraction()).si(), 0.0004, "quality");
        BookValue.of("1794.8")
                .assertMatches(s.value(c.turbine().outlet().enthalpy()).inKilojoulesPerKilogram(), 0.3, "h2 in kJ/kg");
    }

    private record Reheat(
            Heater boiler,
            Turbine high,
            Heater reheater,
            Turbine low,
            Cooler condenser,
            Pump pump,
            Plant plant,
            Variable<Power> net,
            Variable<Power> heat) {
        static Reheat cycle() {
            final var b = Plant.builder("reheat cycle");
            final var boiler = b.add(new Heater("boiler"));
            final var high = b.add(new Turbine("high-pressure turbine"));
            final var reheater = b.add(new Heater("reheater"));
            final var low = b.add(new Turbine("low-pressure turbine"));
            final var condenser = b.add(new Cooler("condenser"));
            final var pump = b.add(new Pump("pump"));
            b.circuit(Water.industrial(), boiler, high, reheater, low, condenser, pump);
            final Expression work = high.power().plus(low.power()).minus(pump.power());
            final var net = b.define("net power", Power.KIND, work);
            final var heat = b.define("heat input", Power.KIND, boiler.duty().plus(reheater.duty()));
            return new Reheat(boiler, high, reheater, low, condenser, pump, b.build(), net, heat);
        }

        Solution solve(double mpa, double degrees, double reheatMpa, double reheatDegrees, double condenserMpa) {
            return plant.specify()
                    .given(high.inlet().pressure(), megapascal(mpa))
                    .given(high.inlet().temperature(), celsius(degrees))
                    .given(low.inlet().pressure(), megapascal(reheatMpa))
                    .given(low.inlet().temperature(), celsius(reheatDegrees))
                    .given(condenser.outlet().pressure(), megapascal(condenserMpa))
                    .given(condenser.outlet().vapourFraction(), percent(0))
                    .given(high.isentropicEfficiency(), percent(100))
                    .given(low.isentropicEfficiency(), percent(100))
                    .given(pump.isentropicEfficiency(), percent(100))
                    .given(boiler.inlet().flow(), kilogramsPerSecond(1))
                    .solve();
        }

        double efficiencyInPercent(Solution s) {
            return 100 * s.value(net).inWatts() / s.value(heat).inWatts();
        }
    }

    /** 4 MPa, 400 °C; reheat 400 kPa, 400 °C; 10 kPa. */
    @Test
    void reheatOfVanWylenSonntagBorgnakke() {
        final Reheat c = Reheat.cycle();
        final Solution s = c.solve(4, 400, 0.4, 400, 0.01);
        BookValue.of("528.2").assertMatches(s.value(c.high().power()).inKilowatts(), 0.1, "high-pressure work");
        BookValue.of("769.3").assertMatches(s.value(c.low().power()).inKilowatts(), "low-pressure work");
        BookValue.of("0.9757")
                .assertMatches(s.value(c.high().outlet().vapourFraction()).si(), "quality before reheat");
        BookValue.of("0.9669")
                .assertMatches(s.value(c.low().outlet().vapourFraction()).si(), 0.0001, "quality at the end");
        BookValue.of("4.0").assertMatches(s.value(c.pump().power()).inKilowatts(), "pump work");
        BookValue.of("195.8")
                .assertMatches(s.value(c.pump().outlet().enthalpy()).inKilojoulesPerKilogram(), "feedwater in kJ/kg");
        BookValue.of("35.9").assertMatches(c.efficiencyInPercent(s), "thermal efficiency in %");
    }

    /** 15 MPa, 600 °C; reheat 4 MPa, 600 °C; 10 kPa. */
    @Test
    void cengelExample10Point4() {
        final Reheat c = Reheat.cycle();
        final Solution s = c.solve(15, 600, 4, 600, 0.01);
        BookValue.of("45.0").assertMatches(c.efficiencyInPercent(s), "thermal efficiency in %");
        BookValue.of("0.896")
                .assertMatches(s.value(c.low().outlet().vapourFraction()).si(), "quality at the end");
    }

    /** 8 MPa, 480 °C; reheat 0.7 MPa, 440 °C; 0.008 MPa; 100 MW net. */
    @Test
    void moranShapiroExample8Point3() {
        final Reheat c = Reheat.cycle();
        final Solution unit = c.solve(8, 480, 0.7, 440, 0.008);
        final Solution s = unit.specification()
                .release(c.boiler().inlet().flow())
                .given(c.net(), Power.megawatts(100))
                .solve();
        BookValue.of("40.3").assertMatches(c.efficiencyInPercent(s), "thermal efficiency in %");
        BookValue.of("2.363e5")
                .assertMatches(
                        s.value(c.boiler().inlet().flow()).inKilogramsPerSecond() * 3600, 60, "steam flow in kg/h");
        BookValue.of("148").assertMatches(s.value(c.condenser().duty()).inMegawatts(), "heat rejected in MW");
        BookValue.of("0.9382")
                .assertMatches(s.value(c.low().outlet().vapourFraction()).si(), 0.0004, "quality at the end");
    }

    /**
     * 8 MPa, 480 °C; open feedwater heater at 0.7 MPa, saturated water behind it; 0.008 MPa; turbine stages of 85 %, ideal
     * pumps, 100 MW net. Nothing is said of the flows but the net power.
     */
    @Test
    void moranShapiroExample8Point5() {
        final var b = Plant.builder("open feedwater heater");
        final var boiler = b.add(new Heater("boiler"));
        final var high = b.add(new Turbine("turbine 1"));
        final var extraction = b.add(new Splitter("extraction"));
        final var low = b.add(new Turbine("turbine 2"));
        final var condenser = b.add(new Cooler("condenser"));
        final var condensatePump = b.add(new Pump("condensate pump"));
        final var heater = b.add(new Mixer("open heater"));
        final var feedPump = b.add(new Pump("feed pump"));
        b.circuit(
                Water.industrial(),
                boiler,
                high,
                extraction.path(1),
                low,
                condenser,
                condensatePump,
                heater.path(1),
                feedPump);
        b.connect(extraction.outlet(2), heater.inlet(2));
        final var net = b.define(
                "net power",
                Power.KIND,
                high.power().plus(low.power()).minus(condensatePump.power()).minus(feedPump.power()));
        final Solution s = b.build()
                .specify()
                .given(high.inlet().pressure(), megapascal(8))
                .given(high.inlet().temperature(), celsius(480))
                .given(extraction.inlet().pressure(), megapascal(0.7))
                .given(heater.outlet().vapourFraction(), percent(0))
                .given(condenser.outlet().pressure(), megapascal(0.008))
                .given(condenser.outlet().vapourFraction(), percent(0))
                .given(high.isentropicEfficiency(), percent(85))
                .given(low.isentropicEfficiency(), percent(85))
                .given(condensatePump.isentropicEfficiency(), percent(100))
                .given(feedPump.isentropicEfficiency(), percent(100))
                .given(net, Power.megawatts(100))
                .solve();
        BookValue.of("0.1966").assertMatches(s.value(extraction.fraction(2)).si(), 0.0001, "extraction fraction");
        BookValue.of("36.9").assertMatches(100 * 100 / s.value(boiler.duty()).inMegawatts(), "thermal efficiency in %");
        BookValue.of("3.69e5")
                .assertMatches(s.value(boiler.inlet().flow()).inKilogramsPerSecond() * 3600, "steam flow in kg/h");
        assertEquals(0, s.closure().energy(), 1e-9);
    }
}
