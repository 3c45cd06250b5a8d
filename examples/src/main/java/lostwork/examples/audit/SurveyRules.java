package lostwork.examples.audit;

/** The fixed limits of a survey. */
final class SurveyRules {
    /** Hours of a year without a leap day. */
    static final double HOURS_OF_A_YEAR = 8760;

    /** How far the shares of a composition may sum from 100 %, for rounding; they are scaled to 100 %. */
    static final double COMPOSITION_TOLERANCE_PERCENT = 0.2;

    private SurveyRules() {}
}
