package lostwork.examples.bench;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;

import lostwork.component.Cooler;
import lostwork.component.Generator;
import lostwork.component.Heater;
import lostwork.component.Mixer;
import lostwork.component.Pump;
import lostwork.component.Shaft;
import lostwork.component.Splitter;
import lostwork.component.Turbine;
import lostwork.fluid.Fluid;
import lostwork.plant.Plant;
import lostwork.plant.Specification;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;

/**
 * A steam plant of ten components in a closed circuit: boiler, two turbines with an extraction between them, condenser, two
 * pumps, an open feed heater, a shaft and a generator.
 *
 * <p>The extraction is not given: the feed leaves the heater as saturated liquid, and that settles it.
 */
final class SteamPlant {
    private final Heater boiler = new Heater("boiler");
    private final Turbine highPressure = new Turbine("high-pressure turbine");
    private final Splitter extraction = new Splitter("extraction");
    private final Turbine lowPressure = new Turbine("low-pressure turbine");
    private final Cooler condenser = new Cooler("condenser");
    private final Pump condensatePump = new Pump("condensate pump");
    private final Mixer feedHeater = new Mixer("feed heater");
    private final Pump feedPump = new Pump("feed pump");
    private final Shaft shaft = new Shaft("shaft").withDriving(2);
    private final Generator generator = new Generator("generator");
    private final Plant plant;

    SteamPlant(Fluid water) {
        final var b = Plant.builder("steam plant");
        b.add(boiler);
        b.add(highPressure);
        b.add(extraction);
        b.add(lowPressure);
        b.add(condenser);
        b.add(condensatePump);
        b.add(feedHeater);
        b.add(feedPump);
        b.add(shaft);
        b.add(generator);
        b.circuit(
                water,
                boiler,
                highPressure,
                extraction.path(1),
                lowPressure,
                condenser,
                condensatePump,
                feedHeater.path(1),
                feedPump);
        b.connect(extraction.outlet(2), feedHeater.inlet(2));
        b.connect(highPressure.shaft(), shaft.driving(1)).connect(lowPressure.shaft(), shaft.driving(2));
        b.connect(shaft.driven(1), generator.shaft());
        plant = b.build();
    }

    Variable<Power> power() {
        return generator.power();
    }

    Variable<Pressure> livePressure() {
        return highPressure.inlet().pressure();
    }

    Specification design() {
        return plant.specify()
                .given(livePressure(), bar(80))
                .given(highPressure.inlet().temperature(), celsius(500))
                .given(highPressure.inlet().flow(), kilogramsPerSecond(40))
                .given(extraction.inlet().pressure(), bar(8))
                .given(condenser.outlet().pressure(), bar(0.08))
                .given(condenser.outlet().vapourFraction(), percent(0))
                .given(feedHeater.outlet().vapourFraction(), percent(0))
                .given(highPressure.isentropicEfficiency(), percent(86))
                .given(lowPressure.isentropicEfficiency(), percent(84))
                .given(condensatePump.isentropicEfficiency(), percent(75))
                .given(feedPump.isentropicEfficiency(), percent(78))
                .given(shaft.mechanicalEfficiency(), percent(99))
                .given(generator.efficiency(), percent(98));
    }
}
