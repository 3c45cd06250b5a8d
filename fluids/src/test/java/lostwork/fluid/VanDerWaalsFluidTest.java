package lostwork.fluid;

/** A fluid with a critical point, a compressible liquid and a compressible vapour through the generic searches. */
class VanDerWaalsFluidTest extends FluidContract {
    private final Fluid fluid = Fluid.of(new VanDerWaalsFluid());

    VanDerWaalsFluidTest() {}

    @Override
    protected int states() {
        return 1_000;
    }

    @Override
    protected Fluid fluid() {
        return fluid;
    }
}
