package lostwork.process;

import lostwork.quantity.OutOfRangeException;

/**
 * How many times the pressure of a closed mass becomes larger or smaller: the end of a step, told from its start.
 *
 * <p>The ratio is always above 1; the factory tells the direction. Immutable and thread-safe.
 */
public final class PressureRatio {
    private final double endPerStart;

    private PressureRatio(double endPerStart) {
        this.endPerStart = endPerStart;
    }

    /**
     * {@return a rise: the pressure at the end per pressure at the start}
     *
     * @param ratio how many times, above 1
     * @throws OutOfRangeException if the ratio is not above 1 or not finite
     */
    public static PressureRatio raisedByFactor(double ratio) {
        return new PressureRatio(VolumeRatio.requireAboveOne("pressure ratio", ratio));
    }

    /**
     * {@return a fall: the pressure at the start per pressure at the end}
     *
     * @param ratio how many times, above 1
     * @throws OutOfRangeException if the ratio is not above 1 or not finite
     */
    public static PressureRatio loweredByFactor(double ratio) {
        return new PressureRatio(1 / VolumeRatio.requireAboveOne("pressure ratio", ratio));
    }

    /** {@return pressure at the end per pressure at the start} */
    double endPerStart() {
        return endPerStart;
    }

    @Override
    public String toString() {
        return endPerStart > 1
                ? "pressure raised by the factor " + endPerStart
                : "pressure lowered by the factor " + 1 / endPerStart;
    }
}
