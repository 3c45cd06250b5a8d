package lostwork.fluid;

import java.util.Locale;

/**
 * Thrown when no state with the two properties asked for is found within the range of a model.
 *
 * <p>A temperature or a pressure outside the range, or a value that the range does not reach at a given temperature or
 * pressure, is refused with {@link lostwork.quantity.OutOfRangeException}, which knows the limits. This exception is for
 * two values such as (h,s) that are possible each by itself but not together, and for a search that ends at a jump of the
 * model or at derivatives that contradict it; {@link FluidCheck} finds these.
 */
public final class FlashException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** The fluid. */
    private final String fluid;
    /** The search that ended. */
    private final String search;
    /** The distance that was left, relative. */
    private final double residual;
    /** The number of evaluations. */
    private final int iterations;

    /**
     * Creates the exception.
     *
     * @param fluid the name of the fluid
     * @param search what was asked for, in words and SI units
     * @param residual the distance from the value asked for that was left, relative
     * @param iterations how many iterations were made
     * @param wayOut what the caller can do, as a clause
     */
    public FlashException(String fluid, String search, double residual, int iterations, String wayOut) {
        this(
                String.format(
                        Locale.ROOT,
                        "%s: no state with %s; after %d iterations the relative distance is %.3g; %s",
                        fluid,
                        search,
                        iterations,
                        residual,
                        wayOut),
                fluid,
                search,
                residual,
                iterations);
    }

    private FlashException(String message, String fluid, String search, double residual, int iterations) {
        super(message);
        this.fluid = fluid;
        this.search = search;
        this.residual = residual;
        this.iterations = iterations;
    }

    /** {@return the failure of a search that met the ends of the range} */
    static FlashException outside(FluidModel model, String search, double residual, int iterations) {
        final FluidRange range = model.range();
        final String message = String.format(
                Locale.ROOT,
                "%s: no state with %s within T = %s .. %s K, p = %s .. %s Pa (%s); %s",
                model.name(),
                search,
                range.lowestTemperature(),
                range.highestTemperature(),
                range.lowestPressure(),
                range.highestPressure(),
                range.limitedBy(),
                FluidRange.WAY_OUT);
        return new FlashException(message, model.name(), search, residual, iterations);
    }

    /** {@return the name of the fluid} */
    public String fluid() {
        return fluid;
    }

    /** {@return what was asked for, in words and SI units} */
    public String search() {
        return search;
    }

    /** {@return the distance from the value asked for that was left, relative} */
    public double residual() {
        return residual;
    }

    /** {@return how many iterations were made} */
    public int iterations() {
        return iterations;
    }
}
