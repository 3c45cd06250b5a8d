package lostwork.examples.audit;

/** The fuels that a survey may name. */
enum SurveyFuel {
    /** A typical pipeline gas; the composition is common practice, no source. */
    NATURAL_GAS("natural gas", "CH4 93 %, C2H6 4 %, N2 2 %, CO2 1 % by mole"),
    METHANE("methane", "CH4"),
    PROPANE("propane", "C3H8"),
    HYDROGEN("hydrogen", "H2");

    private static final Vocabulary<SurveyFuel> NAMES = names();

    private final String label;
    private final String composition;

    SurveyFuel(String label, String composition) {
        this.label = label;
        this.composition = composition;
    }

    private static Vocabulary<SurveyFuel> names() {
        final Vocabulary<SurveyFuel> names = new Vocabulary<>("fuel");
        for (SurveyFuel fuel : values()) {
            names.with(fuel.label, fuel);
        }
        return names;
    }

    /** {@return the names that are understood} */
    static Vocabulary<SurveyFuel> vocabulary() {
        return NAMES;
    }

    String label() {
        return label;
    }

    /** {@return the composition in words} */
    String composition() {
        return composition;
    }
}
