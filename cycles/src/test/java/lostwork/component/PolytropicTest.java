package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.plant.Component;
import lostwork.plant.FlowPath;
import lostwork.plant.Plant;
import lostwork.plant.PlantSolveException;
import lostwork.plant.Solution;
import lostwork.plant.SolveOptions;
import lostwork.plant.Specification;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

class PolytropicTest {
    private static <C extends Component & FlowPath> Specification line(
            Fluid fluid, Pressure p, Temperature t, C machine) {
        final var b = Plant.builder("line");
        final var supply = b.add(new Supply("supply", fluid));
        final var discharge = b.add(new Discharge("discharge"));
        b.add(machine);
        b.connect(supply.outlet(), machine.inlet()).connect(machine.outlet(), discharge.inlet());
        return b.build()
                .specify()
                .given(supply.flow(), kilogramsPerSecond(1))
                .given(supply.pressure(), p)
                .given(supply.temperature(), t);
    }

    /** T₂ = T₁ (p₂/p₁)^((κ−1)/(κ ηₚ)): Dixon, Hall, Fluid Mechanics and Thermodynamics of Turbomachinery (from memory). */
    @Test
    void compressionOfAPerfectGas() {
        final var machine = new Compressor("compressor");
        final var s = line(TestGas.COLD_AIR, bar(1), celsius(15), machine)
                .given(machine.pressureRatio(), Ratio.fraction(20))
                .given(machine.polytropicEfficiency(), percent(88))
                .solve();
        final double ratio = Math.pow(20, 0.4 / 1.4 / 0.88);
        assertEquals(288.15 * ratio, s.value(machine.outlet().temperature()).inKelvin(), 1e-8);
        assertEquals(
                (Math.pow(20, 0.4 / 1.4) - 1) / (ratio - 1),
                s.value(machine.isentropicEfficiency()).si(),
                1e-11);
    }

    /** T₂ = T₁ (p₂/p₁)^(ηₚ (κ−1)/κ): the same source. */
    @Test
    void expansionOfAPerfectGas() {
        final var machine = new Turbine("turbine");
        final var s = line(TestGas.COLD_AIR, bar(20), celsius(1100), machine)
                .given(machine.pressureRatio(), Ratio.fraction(18))
                .given(machine.polytropicEfficiency(), percent(86))
                .solve();
        final double ratio = Math.pow(18, -0.86 * 0.4 / 1.4);
        assertEquals(1373.15 * ratio, s.value(machine.outlet().temperature()).inKelvin(), 1e-8);
    }

    /** For an ideal gas whose heat capacity varies: ηₚ = 1 / (1 + (s₂ − s₁) / (R ln p₂/p₁)), which needs no path. */
    @Test
    void isExactForAnIdealGas() {
        final var air = DryAir.standard();
        final var machine = new Compressor("compressor");
        final var s = line(air, bar(1), celsius(15), machine)
                .given(machine.pressureRatio(), Ratio.fraction(15))
                .given(machine.isentropicEfficiency(), percent(83))
                .solve();
        final double rise = s.state(machine.outlet()).entropy().si()
                - s.state(machine.inlet()).entropy().si();
        final double gasConstant = 8.31446261815324 / air.model().molarMass();
        assertEquals(
                1 / (1 + rise / (gasConstant * Math.log(15))),
                s.value(machine.polytropicEfficiency()).si(),
                1e-12);
    }

    /**
     * A real fluid against its own definition: many small stages, each of the isentropic efficiency 0.85, in a loop that
     * shares nothing with the path. The deviation shrinks with the number of stages, so two numbers extrapolate to
     * infinitely many (Richardson). Superheated steam agrees to 1e-8; wet steam to what the kink at the saturation line
     * costs.
     */
    @Test
    void manySmallStagesMakeThePolytropicMachine() {
        assertEquals(0.85, 2 * afterStages(2000, 12) - afterStages(1000, 12), 1e-8);
        assertEquals(0.85, 2 * afterStages(2000, 0.1) - afterStages(1000, 0.1), 3e-5);
    }

    private static double afterStages(int stages, double to) {
        final var water = Water.industrial();
        final double from = 40;
        var state = water.state(celsius(400), bar(from));
        for (int i = 1; i <= stages; i++) {
            final var p = bar(from * Math.pow(to / from, (double) i / stages));
            final double h = state.enthalpy().si();
            final double ideal = water.state(p, state.entropy()).enthalpy().si();
            state = water.state(p, SpecificEnergy.joulesPerKilogram(h - 0.85 * (h - ideal)));
        }
        final var machine = new Turbine("turbine");
        return line(water, bar(from), celsius(400), machine)
                .given(machine.outlet().pressure(), bar(to))
                .given(machine.outlet().enthalpy(), state.enthalpy())
                .solve()
                .value(machine.polytropicEfficiency())
                .si();
    }

    @Test
    void givenForSteamItFindsTheOutletAgain() {
        final var machine = new Turbine("turbine");
        final var free = line(Water.industrial(), bar(60), celsius(480), machine)
                .given(machine.outlet().pressure(), bar(0.1));
        final Solution design =
                free.given(machine.isentropicEfficiency(), percent(84)).solve();
        final Solution again = free.given(machine.polytropicEfficiency(), design.value(machine.polytropicEfficiency()))
                .solve();
        assertEquals(84, again.value(machine.isentropicEfficiency()).inPercent(), 1e-8);
    }

    @Test
    void efficienciesAboveOneHundredPercentAreRefusedOrReported() {
        final var machine = new Turbine("turbine");
        final var given = line(TestGas.COLD_AIR, bar(20), celsius(1100), machine)
                .given(machine.pressureRatio(), Ratio.fraction(18));
        for (Specification s : new Specification[] {
            given.given(machine.isentropicEfficiency(), percent(130)),
            given.given(machine.polytropicEfficiency(), percent(104)),
            given.given(machine.outlet().temperature(), celsius(200))
        }) {
            final var refused = assertThrows(PlantSolveException.class, s::solve);
            assertEquals(PlantSolveException.Reason.IMPOSSIBLE, refused.reason());
            assertTrue(
                    refused.getMessage().contains("turbine: an isentropic efficiency of at most 100 % is not met"),
                    refused.getMessage());
            assertTrue(refused.getMessage().contains("turbine would destroy entropy"), refused.getMessage());
            final var findings = s.solve(SolveOptions.defaults().with(SolveOptions.SecondLaw.REPORTED))
                    .violations();
            assertEquals(2, findings.size(), findings.toString());
        }
    }
}
