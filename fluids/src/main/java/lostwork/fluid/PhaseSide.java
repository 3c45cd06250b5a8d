package lostwork.fluid;

/** The side of the saturation line that a single-phase evaluation is asked for. */
public enum PhaseSide {
    /** The liquid side. */
    LIQUID,
    /** The vapour side, and the only side of a fluid without saturation. */
    VAPOUR
}
