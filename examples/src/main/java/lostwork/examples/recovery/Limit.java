package lostwork.examples.recovery;

/** What keeps the gas from being cooled further. */
public enum Limit {
    /** The least temperature difference in the boiler. */
    PINCH("pinch"),
    /** The lowest temperature that the gas may have. */
    LOWEST_GAS_TEMPERATURE("lowest gas"),
    /** Both at once. */
    BOTH("both");

    private final String words;

    Limit(String words) {
        this.words = words;
    }

    /** {@return the limit in words} */
    public String words() {
        return words;
    }
}
