package lostwork.fluid.water;

/**
 * Room for the intermediate results of one thread, so that evaluations allocate nothing.
 *
 * <p>Confined to its thread: {@link #ofThread} hands it out, and no kernel of this package keeps it or calls foreign
 * code while it holds values in it.
 */
final class Workspace {
    private static final ThreadLocal<Workspace> OF_THREAD = ThreadLocal.withInitial(Workspace::new);

    /** Powers of the two arguments of a sum. */
    final double[] firstPowers = new double[64];

    final double[] secondPowers = new double[64];

    /** A sum and its derivatives. The letters say by which argument: {@code ft} is by the first and the second. */
    double value;

    double f;
    double t;
    double ff;
    double tt;
    double ft;

    private Workspace() {}

    static Workspace ofThread() {
        return OF_THREAD.get();
    }
}
