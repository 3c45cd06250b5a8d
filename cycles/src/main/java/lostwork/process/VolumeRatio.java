package lostwork.process;

import lostwork.quantity.OutOfRangeException;

/**
 * How many times the volume of a closed mass becomes smaller or larger: the end of a step, told from its start.
 *
 * <p>The ratio is always above 1; the factory tells the direction, so that a compression ratio is never taken for its
 * inverse. Immutable and thread-safe.
 */
public final class VolumeRatio {
    private final double endPerStart;

    private VolumeRatio(double endPerStart) {
        this.endPerStart = endPerStart;
    }

    /**
     * {@return a compression: the volume at the start per volume at the end}
     *
     * @param ratio the compression ratio, above 1
     * @throws OutOfRangeException if the ratio is not above 1 or not finite
     */
    public static VolumeRatio compressionRatio(double ratio) {
        return new VolumeRatio(1 / requireAboveOne("compression ratio", ratio));
    }

    /**
     * {@return an expansion: the volume at the end per volume at the start, as the cut-off ratio of a Diesel cycle}
     *
     * @param ratio the expansion ratio, above 1
     * @throws OutOfRangeException if the ratio is not above 1 or not finite
     */
    public static VolumeRatio expansionRatio(double ratio) {
        return new VolumeRatio(requireAboveOne("expansion ratio", ratio));
    }

    static double requireAboveOne(String name, double ratio) {
        if (!(ratio > 1 && ratio < Double.POSITIVE_INFINITY)) {
            throw new OutOfRangeException(
                    name,
                    ratio,
                    Math.nextUp(1.0),
                    Double.MAX_VALUE,
                    "1",
                    "a ratio counts how many times",
                    "give the larger value per smaller value, above 1; the name of the factory tells the direction");
        }
        return ratio;
    }

    /** {@return volume at the end per volume at the start} */
    double endPerStart() {
        return endPerStart;
    }

    @Override
    public String toString() {
        return endPerStart > 1 ? "expansion ratio " + endPerStart : "compression ratio " + 1 / endPerStart;
    }
}
