package lostwork.examples.audit;

/** The keys of a site file; each must be there once. */
enum SiteKey {
    SITE("site"),
    AMBIENT_TEMPERATURE("ambient temperature"),
    AMBIENT_PRESSURE("ambient pressure"),
    RELATIVE_HUMIDITY("relative humidity"),
    CURRENCY("currency"),
    POWER_PRICE("power price"),
    HEAT_PRICE("heat price"),
    GRID_CARBON_INTENSITY("grid carbon intensity");

    private static final Vocabulary<SiteKey> KEYS = keys();

    private final String key;

    SiteKey(String key) {
        this.key = key;
    }

    private static Vocabulary<SiteKey> keys() {
        final Vocabulary<SiteKey> keys = new Vocabulary<>("key");
        for (SiteKey key : values()) {
            keys.with(key.key, key);
        }
        return keys;
    }

    /** {@return the keys that are understood} */
    static Vocabulary<SiteKey> vocabulary() {
        return KEYS;
    }

    String key() {
        return key;
    }
}
