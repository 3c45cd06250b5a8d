package lostwork.component;

import lostwork.fluid.Fluid;
import lostwork.fluid.gas.PerfectGas;
import lostwork.quantity.MolarMass;
import lostwork.quantity.SpecificHeatCapacity;

/** Cold air as textbooks use it: κ = 1.4 and cp = 1.005 kJ/(kg K). */
final class TestGas {
    /** Molar gas constant in J/(mol K), exact (SI Brochure, 9th edition). */
    private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

    static final double HEAT_CAPACITY = 1005;
    static final double EXPONENT = 1.4;
    static final double GAS_CONSTANT = HEAT_CAPACITY * (1 - 1 / EXPONENT);

    static final Fluid COLD_AIR = PerfectGas.of(
            "cold air",
            MolarMass.kilogramsPerMole(MOLAR_GAS_CONSTANT / GAS_CONSTANT),
            SpecificHeatCapacity.joulesPerKilogramKelvin(HEAT_CAPACITY));

    private TestGas() {}
}
