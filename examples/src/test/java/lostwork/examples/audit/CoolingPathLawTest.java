package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.HumidAir;
import lostwork.fluid.water.Water;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** What must hold for every stream, whatever its medium and temperatures. */
class CoolingPathLawTest {
    private static final Pressure PRESSURE = Pressure.bar(12);
    private static final Fluid[] FLUIDS = {
        DryAir.standard(), HumidAir.ofHumidityRatio(Ratio.percent(5)), Water.industrial()
    };

    /** Liquid water at 12 bar reaches up to 187 °C. */
    @Property(seed = "20261201", tries = 500)
    void likelyWorkIsBelowMostWorkAndThatBelowTheHeat(
            @ForAll @IntRange(min = 0, max = 2) int fluid,
            @ForAll @DoubleRange(min = -20, max = 35) double ambient,
            @ForAll @DoubleRange(min = 0.1, max = 0.9) double lowest,
            @ForAll @DoubleRange(min = 0.1, max = 140) double span) {
        final double cold = 1 + Math.max(ambient, 0) + 10 * lowest;
        final CoolingPath path = path(FLUIDS[fluid], cold + span, cold, ambient);
        final double heat = path.heat().value().si();
        final double most = path.reversibleWork().value().si();
        final double likely = path.endoreversibleWork().value().si();
        assertTrue(0 < likely, "likely work");
        assertTrue(likely < most, "likely below most work");
        assertTrue(most < heat, "most work below heat");
        assertTrue(likely >= most / 2 * (1 - 1e-9), "the rule is at least half of the reversible work");
    }

    /** Cooling in two steps gives the same as in one. */
    @Property(seed = "20261202", tries = 200)
    void stepsAddUp(
            @ForAll @IntRange(min = 0, max = 2) int fluid, @ForAll @DoubleRange(min = 40, max = 150) double between) {
        final CoolingPath whole = path(FLUIDS[fluid], 170, 30, 12);
        final CoolingPath upper = path(FLUIDS[fluid], 170, between, 12);
        final CoolingPath lower = path(FLUIDS[fluid], between, 30, 12);
        final double heat = whole.heat().value().si();
        assertEquals(heat, upper.heat().value().plus(lower.heat().value()).si(), 1e-9 * heat);
        assertEquals(
                whole.reversibleWork().value().si(),
                upper.reversibleWork()
                        .value()
                        .plus(lower.reversibleWork().value())
                        .si(),
                1e-9 * heat);
        assertEquals(
                whole.endoreversibleWork().value().si(),
                upper.endoreversibleWork()
                        .value()
                        .plus(lower.endoreversibleWork().value())
                        .si(),
                1e-9 * heat);
    }

    private static CoolingPath path(Fluid fluid, double supply, double lowest, double ambient) {
        return new CoolingPath(
                fluid,
                PRESSURE,
                Temperature.celsius(supply),
                Temperature.celsius(lowest),
                ReferenceEnvironment.of(Temperature.celsius(ambient), Pressure.mbar(1013)));
    }
}
