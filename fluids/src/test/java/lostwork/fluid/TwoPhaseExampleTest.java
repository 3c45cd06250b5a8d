package lostwork.fluid;

class TwoPhaseExampleTest extends FluidContract {
    private final Fluid fluid = Fluid.of(new TwoPhaseExample());

    @Override
    protected Fluid fluid() {
        return fluid;
    }
}
