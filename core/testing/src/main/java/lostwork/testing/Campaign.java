package lostwork.testing;

import org.jspecify.annotations.Nullable;

/**
 * How many cases a random test runs: its usual number in every build, a multiple of it in a long campaign.
 *
 * <p>The factor is the system property {@value #FACTOR}; the Maven profile {@code campaign} sets it. Seeds stay fixed, so
 * that the first cases of a campaign are the cases of the daily build and the rest are new.
 */
public final class Campaign {
    /** Name of the system property that holds the factor, a whole number from 1 to 1,000,000. */
    public static final String FACTOR = "lostwork.campaign.factor";

    private static final int LARGEST = 1_000_000;

    private Campaign() {}

    /**
     * {@return the number of cases to run}
     *
     * @param usual number of cases in the daily build, at least 1
     * @throws IllegalArgumentException if the property is no whole number from 1 to 1,000,000, or the number is below 1
     */
    public static int cases(int usual) {
        return cases(usual, System.getProperty(FACTOR, "1"));
    }

    static int cases(int usual, String factor) {
        if (usual < 1) {
            throw new IllegalArgumentException(usual + " cases would test nothing");
        }
        return Math.toIntExact(Math.min(Integer.MAX_VALUE, (long) usual * read(factor)));
    }

    private static long read(String factor) {
        final long value;
        try {
            value = Long.parseLong(factor.strip());
        } catch (NumberFormatException e) {
            throw refused(factor, e);
        }
        if (value < 1 || value > LARGEST) {
            throw refused(factor, null);
        }
        return value;
    }

    private static IllegalArgumentException refused(String factor, @Nullable NumberFormatException cause) {
        return new IllegalArgumentException(
                FACTOR + " is \"" + factor + "\"; it takes a whole number from 1 to " + LARGEST, cause);
    }
}
