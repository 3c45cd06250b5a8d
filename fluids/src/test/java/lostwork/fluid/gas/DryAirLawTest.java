package lostwork.fluid.gas;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;

class DryAirLawTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return DryAir.standard();
    }
}
