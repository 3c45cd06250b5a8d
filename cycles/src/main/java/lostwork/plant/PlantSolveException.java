package lostwork.plant;

import java.util.List;

/**
 * Thrown when the given values of a plant cannot be met, or do not determine its unknowns. The message names the
 * equations, by how much they miss, and what to do; the same facts are accessors.
 */
public final class PlantSolveException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** Why a plant could not be solved. */
    public enum Reason {
        /** Some equations have no common solution within the bounds of their variables. */
        NOT_MET,
        /** The equations are met but do not determine their unknowns. */
        UNDETERMINED,
        /** The equations are met only outside the range of a fluid. */
        OUTSIDE_RANGE,
        /** A component of the solution would generate negative entropy, or a requirement of it is not met. */
        IMPOSSIBLE,
        /** The time limit ran out. */
        OUT_OF_TIME,
        /** The caller cancelled the solve. */
        CANCELLED
    }

    /** Why. */
    private final Reason reason;
    /** The equations concerned, worst first. */
    private final transient List<Equation> equations;
    /** The unknowns concerned. */
    private final transient List<Variable<?>> unknowns;

    PlantSolveException(Reason reason, String message, List<Equation> equations, List<Variable<?>> unknowns) {
        super(message);
        this.reason = reason;
        this.equations = List.copyOf(equations);
        this.unknowns = List.copyOf(unknowns);
    }

    /** {@return why} */
    public Reason reason() {
        return reason;
    }

    /** {@return the equations concerned, worst first} */
    public List<Equation> equations() {
        return equations;
    }

    /** {@return the unknowns concerned} */
    public List<Variable<?>> unknowns() {
        return unknowns;
    }
}
