package lostwork.fluid.gas;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.FluidState;
import org.junit.jupiter.api.Test;

/**
 * The mixture against the polynomial of air in the same source (NASA/TP-2002-211556, species Air): a check of the mixing
 * rules, entropy of mixing included. The printed digits carry it to 2e-7; entropy has 3e-5 J/(mol K) more, because the
 * source mixes with R = 8.31451 J/(mol K) and this library with the exact constant, and R Σ x ln x differs by as much.
 */
class DryAirTableTest {
    @Test
    void agreesWithThePolynomialOfAir() {
        final IdealGas air = DryAir.standard();
        final Species polynomial = Species.of("Air");
        final double molarMass = air.composition().molarMass().si();
        assertEquals(polynomial.molarMass().inGramsPerMole(), molarMass * 1e3, 1e-5);
        for (double t : new double[] {200, 250, 298.15, 500, 800, 999, 1000, 1200, 2000, 3000, 6000}) {
            final FluidState state = air.state(kelvin(t), bar(1));
            final double cp = ((IdealGasModel) air.model()).curve().heatCapacity(t) * molarMass;
            assertEquals(polynomial.molarHeatCapacity(kelvin(t)).si(), cp, 2e-7 * cp, "cp at " + t);
            assertEquals(
                    polynomial.molarEnthalpy(kelvin(t)).si(),
                    state.enthalpy().si() * molarMass,
                    2e-7 * 8.31451 * t,
                    "h at " + t);
            assertEquals(
                    polynomial.molarEntropy(kelvin(t)).si(),
                    state.entropy().si() * molarMass,
                    2e-7 * 8.31451 + 3e-5,
                    "s at " + t);
        }
    }
}
