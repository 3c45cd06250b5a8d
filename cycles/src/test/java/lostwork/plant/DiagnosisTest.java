package lostwork.plant;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Power.kilowatts;
import static lostwork.quantity.Power.megawatts;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.fraction;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.component.Cooler;
import lostwork.component.Heater;
import lostwork.component.Pump;
import lostwork.component.Turbine;
import lostwork.fluid.water.Water;
import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

/** What a user is told, before anything is solved, about the typical mistakes; and what about those that only numbers show. */
class DiagnosisTest {
    private final Plant.Builder builder = Plant.builder("steam set");
    private final Heater boiler = builder.add(new Heater("boiler"));
    private final Turbine turbine = builder.add(new Turbine("turbine"));
    private final Cooler condenser = builder.add(new Cooler("condenser"));
    private final Pump pump = builder.add(new Pump("feed pump"));
    private final Plant plant = builder.circuit(Water.industrial(), boiler, turbine, condenser, pump)
            .build();
    private final Specification design = plant.specify()
            .given(turbine.inlet().pressure(), bar(24))
            .given(turbine.inlet().temperature(), celsius(350))
            .given(turbine.isentropicEfficiency(), percent(78))
            .given(condenser.outlet().pressure(), bar(0.10))
            .given(condenser.outlet().vapourFraction(), percent(0))
            .given(pump.isentropicEfficiency(), percent(65))
            .given(boiler.inlet().flow(), kilogramsPerSecond(3));

    private static SpecificationException refused(Specification specification) {
        return assertThrows(SpecificationException.class, specification::plan);
    }

    @Test
    void theDesignItselfIsComplete() {
        assertTrue(design.solve().value(turbine.power()).inKilowatts() > 0);
    }

    @Test
    void nothingGiven() {
        final SpecificationException e = refused(plant.specify());
        assertEquals(7, e.missing());
        assertTrue(
                e.getMessage().startsWith("plant \"steam set\": 7 more values must be given. Not settled: "),
                e.getMessage());
        assertTrue(e.candidates().contains(turbine.isentropicEfficiency()), e.getMessage());
    }

    @Test
    void closedLoopWhoseFlowIsNeverGiven() {
        final SpecificationException e = refused(design.release(boiler.inlet().flow()));
        assertEquals(
                "plant \"steam set\": One more value must be given. Not settled: boiler inlet flow, boiler heat rate,"
                        + " condenser heat rate, feed pump shaft power, turbine shaft power.\n"
                        + "Any one of these will do: boiler inlet flow, boiler heat rate, condenser heat rate,"
                        + " feed pump shaft power, turbine shaft power.",
                e.getMessage());
        assertEquals(1, e.missing());
    }

    @Test
    void oneValueForgotten() {
        final SpecificationException e = refused(design.release(turbine.isentropicEfficiency()));
        assertEquals(1, e.missing());
        assertEquals(turbine.outlet().temperature(), e.candidates().get(0));
        assertTrue(e.candidates().contains(turbine.isentropicEfficiency()), e.getMessage());
        assertTrue(e.candidates().contains(turbine.power()), e.getMessage());
    }

    @Test
    void pressureOfOneLineGivenTwice() {
        final SpecificationException e = refused(design.given(boiler.outlet().pressure(), bar(25)));
        assertEquals(
                "plant \"steam set\": boiler outlet pressure and turbine inlet pressure are one and the same value, since"
                        + " their ports are joined; give only one of them",
                e.getMessage());
    }

    @Test
    void pressuresAtBothEndsOfAnApparatusReleaseItsAssumption() {
        final Specification both = design.given(pump.outlet().pressure(), bar(25));
        assertEquals(
                List.of("boiler: no pressure loss"),
                both.plan().assumptionsGivenWay().stream().map(Equation::words).toList());
        assertEquals(1, both.solve().value(boiler.pressureLoss()).inBars(), 1e-9);
    }

    @Test
    void aValueThatTheRestDetermines() {
        final SpecificationException e = refused(design.given(turbine.power(), megawatts(2)));
        assertTrue(
                e.getMessage()
                        .startsWith(
                                "plant \"steam set\": One given value too many: release one of turbine shaft power,"),
                e.getMessage());
        assertTrue(e.getMessage().contains("turbine: power"), e.getMessage());
        assertEquals(turbine.power(), e.surplus().get(0));
    }

    @Test
    void contradictoryTargets() {
        // Too much at one place and too little at another: both are said.
        final SpecificationException e = refused(design.release(pump.isentropicEfficiency())
                .given(turbine.outlet().temperature(), celsius(90)));
        assertTrue(e.getMessage().contains("too many"), e.getMessage());
        assertTrue(e.surplus().contains(turbine.outlet().temperature()), e.getMessage());
        assertTrue(e.candidates().contains(pump.isentropicEfficiency()), e.getMessage());
    }

    @Test
    void unconnectedPort() {
        final Plant.Builder b = Plant.builder("open end");
        final Turbine lone = b.add(new Turbine("turbine"));
        b.connect(
                b.add(new lostwork.component.Supply("steam", Water.industrial()))
                        .outlet(),
                lone.inlet());
        final PlantException e = assertThrows(PlantException.class, b::build);
        assertEquals(
                "plant \"open end\": turbine outlet is not connected; connect it, or end the stream with a Discharge",
                e.getMessage());
    }

    @Test
    void fluidNeverSaid() {
        final Plant.Builder b = Plant.builder("dry loop");
        final Heater heater = b.add(new Heater("heater"));
        final Cooler cooler = b.add(new Cooler("cooler"));
        b.line(heater, cooler).connect(cooler.outlet(), heater.inlet());
        final PlantException e = assertThrows(PlantException.class, b::build);
        assertTrue(
                e.getMessage().contains("the fluid at cooler inlet is not known; start the stream with a Supply"),
                e.getMessage());
    }

    @Test
    void efficiencyBeyondOne() {
        final OutOfRangeException e = assertThrows(
                OutOfRangeException.class, () -> design.with(condenser.outlet().vapourFraction(), fraction(1.2)));
        assertTrue(e.getMessage().startsWith("condenser outlet vapour fraction = 1.2"), e.getMessage());
    }

    /** Heat of boiler and condenser and both powers: four values that obey one law, whatever the loop does. */
    @Test
    void heatsAndWorksOfALoopAllGiven() {
        final Solution s = design.solve();
        final Specification linked = design.release(turbine.isentropicEfficiency())
                .release(pump.isentropicEfficiency())
                .release(turbine.inlet().temperature())
                .given(boiler.duty(), s.value(boiler.duty()))
                .given(condenser.duty(), s.value(condenser.duty()))
                .given(turbine.power(), s.value(turbine.power()));
        final RuntimeException e = assertThrows(
                RuntimeException.class,
                () -> linked.release(boiler.inlet().flow())
                        .given(pump.power(), s.value(pump.power()))
                        .solve());
        assertTrue(e.getMessage().contains("boiler heat rate"), e.getMessage());
    }

    @Test
    void temperatureOfAWetStateSettlesNothing() {
        final Solution s = design.solve();
        final Specification wet = design.release(turbine.isentropicEfficiency())
                .given(
                        turbine.outlet().temperature(),
                        s.value(condenser.outlet().temperature()));
        final PlantSolveException e = assertThrows(PlantSolveException.class, wet::solve);
        assertEquals(PlantSolveException.Reason.UNDETERMINED, e.reason());
        assertTrue(e.getMessage().contains("turbine outlet enthalpy"), e.getMessage());
    }

    @Test
    void aTargetBeyondTheSecondLawNamesTheMachine() {
        final Specification impossible =
                design.release(pump.isentropicEfficiency()).given(pump.power(), kilowatts(0.1));
        final PlantSolveException e = assertThrows(PlantSolveException.class, impossible::solve);
        assertEquals(PlantSolveException.Reason.IMPOSSIBLE, e.reason());
        assertTrue(e.getMessage().contains("feed pump would destroy entropy"), e.getMessage());
    }
}
