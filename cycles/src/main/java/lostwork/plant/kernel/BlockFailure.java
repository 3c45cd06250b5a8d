package lostwork.plant.kernel;

/** Thrown inside the kernel when a block cannot be solved; the plant turns it into words. */
public final class BlockFailure extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private static final double[] NONE = {};

    /** Why a block could not be solved. */
    public enum Reason {
        /** The iteration ended with a residual that is not zero. */
        NOT_MET,
        /** The equations are met, but do not determine their unknowns. */
        SINGULAR,
        /** Temperature and pressure of a state lie on the saturation line and do not tell liquid from vapour. */
        SATURATED,
        /** The time limit ran out. */
        OUT_OF_TIME,
        /** The solve was cancelled. */
        CANCELLED
    }

    /** Why. */
    private final Reason reason;
    /** The place of the block in the order of solving. */
    private final int block;
    /** The equations of the block. */
    private final transient int[] equations;
    /** The scaled residual of each equation of the block. */
    private final transient double[] residuals;
    /** For a singular block, the weight of each equation in the dependency among them; else empty. */
    private final transient double[] dependency;
    /** For a singular block, how far each unknown may move freely; else empty. */
    private final transient double[] freedom;

    BlockFailure(Reason reason, int block, int[] equations, double[] residuals) {
        this(reason, block, equations, residuals, NONE, NONE);
    }

    BlockFailure(Reason reason, int block, int[] equations, double[] residuals, double[] dependency, double[] freedom) {
        super(reason + " in block " + block, null, false, false);
        this.reason = reason;
        this.block = block;
        this.equations = equations.clone();
        this.residuals = residuals;
        this.dependency = dependency;
        this.freedom = freedom;
    }

    /** {@return why} */
    public Reason reason() {
        return reason;
    }

    /** {@return the place of the block in the order of solving} */
    public int block() {
        return block;
    }

    /** {@return the equations of the block} */
    public int[] equations() {
        return equations.clone();
    }

    /** {@return the scaled residual of each equation of the block} */
    public double[] residuals() {
        return residuals.clone();
    }

    /** {@return for a singular block, the weight of each equation in the dependency among them; else empty} */
    public double[] dependency() {
        return dependency.clone();
    }

    /** {@return for a singular block, how far each unknown may move freely, in its scale; else empty} */
    public double[] freedom() {
        return freedom.clone();
    }
}
