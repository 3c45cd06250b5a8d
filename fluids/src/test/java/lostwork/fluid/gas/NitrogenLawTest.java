package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;

class NitrogenLawTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return IdealGas.of(Species.N2);
    }
}
