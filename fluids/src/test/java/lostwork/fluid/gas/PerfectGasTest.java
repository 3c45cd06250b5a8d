package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;
import lostwork.quantity.MolarMass;
import lostwork.quantity.SpecificHeatCapacity;

class PerfectGasTest extends FluidContract {
    private final Fluid fluid = PerfectGas.of(
            "air", MolarMass.gramsPerMole(28.9647), SpecificHeatCapacity.kilojoulesPerKilogramKelvin(1.005));

    @Override
    protected Fluid fluid() {
        return fluid;
    }
}
