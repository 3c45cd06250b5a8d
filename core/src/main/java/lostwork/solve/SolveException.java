package lostwork.solve;

/** Thrown when a numerical method cannot keep its contract; the subclasses say why. */
public abstract sealed class SolveException extends RuntimeException
        permits ConvergenceException, NoSignChangeException, SingularMatrixException {
    private static final long serialVersionUID = 1L;

    /** What was being computed, in the caller's words. */
    private final String task;

    SolveException(String task, String message) {
        super(message);
        this.task = task;
    }

    /** {@return what was being computed, in the caller's words} */
    public final String task() {
        return task;
    }
}
