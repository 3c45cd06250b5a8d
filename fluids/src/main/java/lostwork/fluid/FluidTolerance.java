package lostwork.fluid;

/**
 * How exactly a property model must keep the laws, each relative to the natural scale of the property.
 *
 * <p>Immutable and thread-safe.
 */
public final class FluidTolerance {
    private static final FluidTolerance EXACT = new FluidTolerance(1e-6, 1e-6, 1e-9);

    private final double derivatives;
    private final double saturation;
    private final double flashes;

    private FluidTolerance(double derivatives, double saturation, double flashes) {
        this.derivatives = derivatives;
        this.saturation = saturation;
        this.flashes = flashes;
    }

    /**
     * {@return the tolerances of a model that is exact but for rounding: 1e-6 for derivatives and saturation, which are
     * compared with differences, and 1e-9 for the return of what a flash was asked for}
     */
    public static FluidTolerance exact() {
        return EXACT;
    }

    /**
     * {@return a copy with another tolerance of the derivatives}
     *
     * @param relative the tolerance, above 0
     */
    public FluidTolerance withDerivatives(double relative) {
        return new FluidTolerance(requirePositive(relative), saturation, flashes);
    }

    /**
     * {@return a copy with another tolerance on the saturation line, for formulations whose saturation equation is fitted
     * by itself}
     *
     * @param relative the tolerance, above 0
     */
    public FluidTolerance withSaturation(double relative) {
        return new FluidTolerance(derivatives, requirePositive(relative), flashes);
    }

    /**
     * {@return a copy with another tolerance of the flashes, for formulations with backward equations}
     *
     * @param relative the tolerance, above 0
     */
    public FluidTolerance withFlashes(double relative) {
        return new FluidTolerance(derivatives, saturation, requirePositive(relative));
    }

    private static double requirePositive(double relative) {
        if (!(relative > 0 && relative <= Double.MAX_VALUE)) {
            throw new IllegalArgumentException("tolerance = " + relative + "; it must be above 0 and finite");
        }
        return relative;
    }

    /** {@return the tolerance of the derivatives, relative} */
    public double derivatives() {
        return derivatives;
    }

    /** {@return the tolerance on the saturation line, relative} */
    public double saturation() {
        return saturation;
    }

    /** {@return the tolerance of the flashes, relative} */
    public double flashes() {
        return flashes;
    }

    /** {@return the three tolerances} */
    @Override
    public String toString() {
        return "derivatives " + derivatives + ", saturation " + saturation + ", flashes " + flashes;
    }
}
