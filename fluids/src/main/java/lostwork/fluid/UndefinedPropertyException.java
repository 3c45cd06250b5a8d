package lostwork.fluid;

/** Thrown when a property is asked for that a fluid, or a state of it, does not have. */
public final class UndefinedPropertyException extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    /** The property. */
    private final String property;
    /** The fluid. */
    private final String fluid;

    UndefinedPropertyException(String property, String fluid, String reason, String wayOut) {
        super(fluid + " has no " + property + ": " + reason + "; " + wayOut);
        this.property = property;
        this.fluid = fluid;
    }

    /** {@return the property that was asked for} */
    public String property() {
        return property;
    }

    /** {@return the name of the fluid} */
    public String fluid() {
        return fluid;
    }
}
