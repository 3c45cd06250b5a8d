package lostwork.process;

/** What is held constant while a closed mass changes its state. */
public enum ProcessKind {
    /** Constant temperature. */
    ISOTHERMAL("isothermal"),
    /** Constant entropy: adiabatic and without friction. */
    ISENTROPIC("isentropic"),
    /** Constant volume: a rigid vessel, or a piston at rest. */
    ISOCHORIC("isochoric"),
    /** Constant pressure: a piston under a constant load. */
    ISOBARIC("isobaric"),
    /** Constant {@code p vⁿ}. */
    POLYTROPIC("polytropic");

    private final String words;

    ProcessKind(String words) {
        this.words = words;
    }

    /** {@return the name in words} */
    @Override
    public String toString() {
        return words;
    }
}
