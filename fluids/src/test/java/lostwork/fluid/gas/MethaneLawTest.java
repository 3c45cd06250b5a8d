package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;

class MethaneLawTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return IdealGas.of(Species.of("CH4"));
    }
}
