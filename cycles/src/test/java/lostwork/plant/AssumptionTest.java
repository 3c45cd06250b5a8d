package lostwork.plant;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.PressureDifference.bars;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.component.Cooler;
import lostwork.component.Discharge;
import lostwork.component.Heater;
import lostwork.component.Mixer;
import lostwork.component.Splitter;
import lostwork.component.Supply;
import lostwork.component.Valve;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import org.junit.jupiter.api.Test;

/** When an assumption holds, when it gives way, and when the user has to decide: two branches between one tee and one mixer. */
class AssumptionTest {
    private final Plant.Builder builder = Plant.builder("branches");
    private final Supply air = builder.add(new Supply("air", DryAir.standard()));
    private final Splitter tee = builder.add(new Splitter("tee"));
    private final Heater left = builder.add(new Heater("left heater"));
    private final Heater right = builder.add(new Heater("right heater"));
    private final Mixer mixer = builder.add(new Mixer("mixer"));
    private final Discharge out = builder.add(new Discharge("out"));
    private final Plant plant = builder.connect(air.outlet(), tee.inlet())
            .connect(tee.outlet(1), left.inlet())
            .connect(tee.outlet(2), right.inlet())
            .connect(left.outlet(), mixer.inlet(1))
            .connect(right.outlet(), mixer.inlet(2))
            .connect(mixer.outlet(), out.inlet())
            .build();
    private final Specification design = plant.specify()
            .given(air.flow(), kilogramsPerSecond(1))
            .given(air.temperature(), celsius(20))
            .given(air.pressure(), bar(2))
            .given(tee.fraction(1), percent(30))
            .given(left.outlet().temperature(), celsius(100))
            .given(right.outlet().temperature(), celsius(200));

    private static List<String> words(List<Equation> equations) {
        return equations.stream().map(Equation::words).toList();
    }

    @Test
    void branchesWithoutLossAgreeByThemselves() {
        final Solution s = design.solve();
        assertEquals(2, s.value(out.pressure()).inBar(), 1e-12);
        assertEquals(4, s.plan().assumptions().size());
        assertEquals(List.of(), s.plan().assumptionsGivenWay());
        assertTrue(s.closure().energy() < 1e-12);
    }

    @Test
    void aClosedLoopWithoutMachinesHasOnePressure() {
        final Plant.Builder b = Plant.builder("loop");
        final Heater heater = b.add(new Heater("heater"));
        final Cooler cooler = b.add(new Cooler("cooler"));
        final Solution s = b.circuit(Water.industrial(), heater, cooler)
                .build()
                .specify()
                .given(heater.inlet().flow(), kilogramsPerSecond(1))
                .given(heater.inlet().pressure(), bar(3))
                .given(heater.inlet().temperature(), celsius(60))
                .given(heater.outlet().temperature(), celsius(90))
                .solve();
        assertEquals(3, s.value(cooler.inlet().pressure()).inBar(), 1e-12);
        assertEquals(s.value(heater.duty()).si(), s.value(cooler.duty()).si(), 1e-6);
    }

    @Test
    void theLossOfOneBranchIsThatOfTheOther() {
        final Solution s = design.given(left.pressureLoss(), bars(0.1)).solve();
        assertEquals(0.1, s.value(right.pressureLoss()).inBars(), 1e-12);
        assertEquals(1.9, s.value(out.pressure()).inBar(), 1e-12);
        assertEquals(
                List.of("right heater: no pressure loss", "left heater: no pressure loss").stream()
                        .sorted()
                        .toList(),
                words(s.plan().assumptionsGivenWay()));
    }

    @Test
    void twoLossesNeedThePressureBehindTheMixer() {
        final Specification both = design.given(left.pressureLoss(), bars(0.1)).given(right.pressureLoss(), bars(0.2));
        final SpecificationException e = assertThrows(SpecificationException.class, both::plan);
        assertTrue(e.surplus().containsAll(List.of(left.pressureLoss(), right.pressureLoss())), e.getMessage());
        final Solution s = both.given(out.pressure(), bar(1.8)).solve();
        assertEquals(1.9, s.value(left.outlet().pressure()).inBar(), 1e-12);
        assertEquals(1.8, s.value(right.outlet().pressure()).inBar(), 1e-12);
        assertEquals(1.8, s.value(out.pressure()).inBar(), 1e-12);
    }

    @Test
    void aPressureBelowZeroIsOutsideTheRangeOfTheFluid() {
        final Plant.Builder b = Plant.builder("line");
        final Supply supply = b.add(new Supply("air", DryAir.standard()));
        final Valve valve = b.add(new Valve("valve"));
        final Discharge end = b.add(new Discharge("out"));
        final Specification s = b.connect(supply.outlet(), valve.inlet())
                .connect(valve.outlet(), end.inlet())
                .build()
                .specify()
                .given(supply.flow(), kilogramsPerSecond(1))
                .given(supply.temperature(), celsius(20))
                .given(supply.pressure(), bar(1))
                .given(valve.pressureLoss(), bars(2));
        for (SolveOptions.SecondLaw law : SolveOptions.SecondLaw.values()) {
            final PlantSolveException e = assertThrows(
                    PlantSolveException.class,
                    () -> s.solve(SolveOptions.defaults().with(law)));
            assertEquals(PlantSolveException.Reason.OUTSIDE_RANGE, e.reason());
            assertTrue(e.getMessage().contains("valve outlet"), e.getMessage());
        }
    }
}
