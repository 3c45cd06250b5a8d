package lostwork.process;

import static lostwork.process.PressureRatio.raisedByFactor;
import static lostwork.process.VolumeRatio.compressionRatio;
import static lostwork.process.VolumeRatio.expansionRatio;
import static lostwork.quantity.Mass.kilograms;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.kilopascal;
import static lostwork.quantity.SpecificEnergy.kilojoulesPerKilogram;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.quantity.MolarMass;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;

/**
 * Air-standard piston cycles of two textbooks.
 *
 * <p>The printed figures are recalled, not read. The books interpolate linearly in printed air tables (steps of 10 K and
 * 20 K, older spectroscopic data); this library integrates the NASA nine-coefficient functions. Where this moves a figure
 * out of the rounding of the print, the row carries a bound of its own and says so; the others must round to the print.
 */
class PistonCycleTableTest {
    private static void assertPrinted(double printed, double halfUnit, double actual) {
        assertEquals(printed, actual, halfUnit * (1 + 1e-9));
    }

    /** Y. A. Çengel, M. A. Boles, Thermodynamics: An Engineering Approach, example 9-2 (ideal Otto cycle); from memory. */
    @Test
    void ottoCycleWithVariableHeatCapacity() {
        final ProcessCycle otto = ClosedMass.of(DryAir.standard(), kilograms(1))
                .startingAt(kelvin(290), kilopascal(100))
                .isentropicTo(compressionRatio(8))
                .isochoricAdding(kilojoulesPerKilogram(800))
                .isentropicTo(expansionRatio(8))
                .closedBy(ProcessKind.ISOCHORIC);
        final var steps = otto.steps();
        assertPrinted(4.345, 0.0005, steps.get(1).to().pressure().inMegapascal());
        assertPrinted(52.3, 0.05, otto.thermalEfficiency().inPercent());
        assertPrinted(574, 0.5, otto.meanEffectivePressure().inKilopascals());
        // Table interpolation: the relative volumes 85.34 at 650 K and 81.89 at 660 K leave 0.1 % of 652.4 K open.
        assertEquals(652.4, steps.get(0).to().temperature().inKelvin(), 1.0);
        assertEquals(1575.1, steps.get(1).to().temperature().inKelvin(), 0.5);
        // Follows from the two temperatures: 0.1 % of the heat rejected, 382 kJ/kg.
        assertEquals(418.17, otto.netWork().inKilojoules(), 0.4);
    }

    /** The same example, part with constant heat capacities: 1 − 8^(1−1.4) = 56.5 %. */
    @Test
    void ottoCycleWithConstantHeatCapacity() {
        final ProcessCycle otto = ClosedMass.of(
                        PerfectGas.of("air", MolarMass.gramsPerMole(28.97), Ratio.fraction(1.4)), kilograms(1))
                .startingAt(kelvin(290), kilopascal(100))
                .isentropicTo(compressionRatio(8))
                .isochoricAdding(kilojoulesPerKilogram(800))
                .isentropicTo(expansionRatio(8))
                .closedBy(ProcessKind.ISOCHORIC);
        assertPrinted(56.5, 0.05, otto.thermalEfficiency().inPercent());
    }

    /** M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, example 9.3 (dual cycle); from memory. */
    @Test
    void dualCycleWithVariableHeatCapacity() {
        final ProcessCycle dual = ClosedMass.of(DryAir.standard(), kilograms(1))
                .startingAt(kelvin(300), bar(1))
                .isentropicTo(compressionRatio(18))
                .isochoricTo(raisedByFactor(1.5))
                .isobaricTo(expansionRatio(1.2))
                .isentropicTo(expansionRatio(18 / 1.2))
                .closedBy(ProcessKind.ISOCHORIC);
        final var steps = dual.steps();
        assertPrinted(0.56, 0.005, dual.meanEffectivePressure().inKilopascals() / 1000);
        // The book takes 898.3 K after the compression from its table of relative volumes; 0.1 % is left open there,
        // and
        // both temperatures are its multiples by 1.5 and by 1.5 · 1.2.
        assertEquals(1347.5, steps.get(1).to().temperature().inKelvin(), 1.5);
        assertEquals(1617, steps.get(2).to().temperature().inKelvin(), 1.5 * 1.2);
        assertEquals(63.5, dual.thermalEfficiency().inPercent(), 0.1);
    }

    /** Y. A. Çengel, M. A. Boles, problem on an ideal Ericsson engine between 627 °C and 7 °C, 500 kW; from memory. */
    @Test
    void ericssonEngineWithIdealRegenerator() {
        final ProcessChain chain = ClosedMass.of(DryAir.standard(), kilograms(1))
                .startingAt(celsius(627), bar(10))
                .isothermalTo(bar(1))
                .isobaricTo(celsius(7))
                .isothermalTo(bar(10));
        final ProcessCycle plain = chain.closedBy(ProcessKind.ISOBARIC);
        final ProcessCycle ericsson =
                plain.withRegenerator(plain.steps().get(1), plain.steps().get(3));
        assertPrinted(726, 0.5, 500 * ericsson.heatIn().over(ericsson.netWork()).si());
    }
}
