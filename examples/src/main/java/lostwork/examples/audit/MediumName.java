package lostwork.examples.audit;

/** The media that a survey may name. */
enum MediumName {
    DRY_AIR("dry air"),
    HUMID_AIR("humid air"),
    FLUE_GAS("flue gas"),
    GAS_MIXTURE("gas mixture"),
    WATER("water");

    private static final Vocabulary<MediumName> NAMES = names();

    private final String label;

    MediumName(String label) {
        this.label = label;
    }

    private static Vocabulary<MediumName> names() {
        final Vocabulary<MediumName> names = new Vocabulary<>("medium");
        for (MediumName medium : values()) {
            names.with(medium.label, medium);
        }
        return names;
    }

    /** {@return the names that are understood} */
    static Vocabulary<MediumName> vocabulary() {
        return NAMES;
    }
}
