package lostwork.examples.audit;

/** The gases that a composition in a survey may name, by formula. */
enum SurveyGas {
    N2,
    O2,
    AR("Ar"),
    CO2,
    H2O,
    CO,
    H2,
    CH4,
    SO2,
    NO,
    N2O,
    NH3,
    HE("He");

    private static final Vocabulary<SurveyGas> FORMULAS = formulas();

    private final String formula;

    SurveyGas() {
        this.formula = name();
    }

    SurveyGas(String formula) {
        this.formula = formula;
    }

    private static Vocabulary<SurveyGas> formulas() {
        final Vocabulary<SurveyGas> formulas = new Vocabulary<>("gas");
        for (SurveyGas gas : values()) {
            formulas.with(gas.formula, gas);
        }
        return formulas;
    }

    /** {@return the formulas that are understood} */
    static Vocabulary<SurveyGas> vocabulary() {
        return FORMULAS;
    }

    String formula() {
        return formula;
    }
}
