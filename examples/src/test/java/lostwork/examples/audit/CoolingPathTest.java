package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.quantity.MolarMass;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

class CoolingPathTest {
    private static final Pressure PRESSURE = Pressure.mbar(1013);
    private static final ReferenceEnvironment AMBIENT = ReferenceEnvironment.of(Temperature.celsius(12), PRESSURE);

    @Test
    void ofAPerfectGasAgreesWithTheClosedForms() {
        final double cp = 1004.5;
        final Fluid gas = PerfectGas.of(
                "test gas", MolarMass.gramsPerMole(28.96), SpecificHeatCapacity.joulesPerKilogramKelvin(cp));
        final double t0 = 285.15;
        for (double hot : new double[] {300, 450, 900, 1500}) {
            for (double cold : new double[] {285.15, 295}) {
                final CoolingPath path =
                        new CoolingPath(gas, PRESSURE, Temperature.kelvin(hot), Temperature.kelvin(cold), AMBIENT);
                final double heat = cp * (hot - cold);
                final double most = heat - t0 * cp * Math.log(hot / cold);
                final double likely = heat - 2 * cp * Math.sqrt(t0) * (Math.sqrt(hot) - Math.sqrt(cold));
                assertEquals(heat, path.heat().value().si(), 1e-9 * heat);
                assertEquals(most, path.reversibleWork().value().si(), 1e-9 * heat);
                assertEquals(likely, path.endoreversibleWork().value().si(), 1e-9 * heat);
            }
        }
    }

    @Test
    void likelyWorkLiesBetweenHalfAndAllOfTheReversibleWork() {
        // (1 - sqrt(x)) / (1 - x) = 1 / (1 + sqrt(x)), with x = T0/T from 0 to 1
        for (double hot = 20; hot <= 1500; hot += 37) {
            final CoolingPath path = new CoolingPath(
                    DryAir.standard(), PRESSURE, Temperature.celsius(hot), Temperature.celsius(15), AMBIENT);
            final double share = path.endoreversibleWork().value().si()
                    / path.reversibleWork().value().si();
            assertEquals(0.75, share, 0.25, "supply " + hot + " °C");
        }
    }

    /**
     * Efficiencies of F. L. Curzon and B. Ahlborn, Am. J. Phys. 43 (1975) 22-24, table 1, from memory: 565 and 25 °C
     * 40 %, 300 and 25 °C 28 %, 250 and 80 °C 17.5 %. The printed temperatures give 40.36, 27.88 and 17.84 %; half a
     * percent covers the rounding of the paper.
     */
    @Test
    void aThinSliceHasTheEfficiencyOfThePaper() {
        assertEquals(40, thinSlicePercent(565, 25), 0.5);
        assertEquals(28, thinSlicePercent(300, 25), 0.5);
        assertEquals(17.5, thinSlicePercent(250, 80), 0.5);
    }

    private static double thinSlicePercent(double hot, double ambient) {
        final ReferenceEnvironment surroundings = ReferenceEnvironment.of(Temperature.celsius(ambient), PRESSURE);
        final CoolingPath path = new CoolingPath(
                DryAir.standard(), PRESSURE, Temperature.celsius(hot), Temperature.celsius(hot - 0.01), surroundings);
        return 100
                * path.endoreversibleWork().value().si()
                / path.heat().value().si();
    }

    @Test
    void reversibleWorkIsTheDifferenceOfTheFlowExergies() {
        for (Fluid fluid : List.of(DryAir.standard(), Water.industrial())) {
            final Pressure pressure = Pressure.bar(8);
            final CoolingPath path =
                    new CoolingPath(fluid, pressure, Temperature.celsius(150), Temperature.celsius(30), AMBIENT);
            final double expected = AMBIENT.flowExergy(fluid.state(Temperature.celsius(150), pressure))
                    .minus(AMBIENT.flowExergy(fluid.state(Temperature.celsius(30), pressure)))
                    .si();
            assertEquals(expected, path.reversibleWork().value().si(), 1e-9 * expected);
        }
    }

    @Test
    void derivativesAgreeWithDifferences() {
        final double step = 0.01;
        final CoolingPath low = path(400 - step);
        final CoolingPath path = path(400);
        final CoolingPath high = path(400 + step);
        assertSlope(low.heat(), path.heat(), high.heat(), step);
        assertSlope(low.reversibleWork(), path.reversibleWork(), high.reversibleWork(), step);
        assertSlope(low.endoreversibleWork(), path.endoreversibleWork(), high.endoreversibleWork(), step);
    }

    private static CoolingPath path(double supply) {
        return new CoolingPath(
                DryAir.standard(), PRESSURE, Temperature.celsius(supply), Temperature.celsius(50), AMBIENT);
    }

    private static void assertSlope(
            CoolingPath.Yield low, CoolingPath.Yield middle, CoolingPath.Yield high, double step) {
        final double slope = (high.value().si() - low.value().si()) / (2 * step);
        assertEquals(slope, middle.perKelvin().si(), 1e-6 * slope);
    }
}
