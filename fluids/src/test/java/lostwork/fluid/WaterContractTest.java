package lostwork.fluid;

import lostwork.fluid.water.Water;

class WaterContractTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return Water.industrial();
    }

    /**
     * The saturation equation of IAPWS-IF97 is fitted by itself. Against the basic equations of the two sides its slope is
     * off by up to 1.8e-4 and the Gibbs energies by 5e-6 of T (s″ − s′); both figures follow from the release's
     * coefficients, not from this code.
     */
    @Override
    protected FluidTolerance tolerance() {
        return FluidTolerance.exact().withSaturation(2e-4);
    }

    /** Cold water contracts on heating below 4 °C, so two states share (p,v), (T,s), (u,v) or (s,v) there. */
    @Override
    boolean isUnique(StatePair pair, StatePoint point) {
        return point.temperature > 285;
    }
}
