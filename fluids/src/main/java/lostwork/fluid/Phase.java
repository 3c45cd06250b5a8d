package lostwork.fluid;

/** The phase region that a state lies in. */
public enum Phase {
    /** Below the critical temperature, at or above the saturation pressure. */
    LIQUID("liquid"),
    /** Liquid and vapour in equilibrium. */
    TWO_PHASE("two-phase"),
    /** At or below the saturation pressure; above the critical temperature, below the critical pressure. */
    VAPOUR("vapour"),
    /** At or above the critical temperature and the critical pressure. */
    SUPERCRITICAL("supercritical"),
    /** A fluid whose model knows no other phase. */
    GAS("gas");

    private final String words;

    Phase(String words) {
        this.words = words;
    }

    /** {@return the name in words} */
    @Override
    public String toString() {
        return words;
    }
}
