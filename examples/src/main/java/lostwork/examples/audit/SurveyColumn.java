package lostwork.examples.audit;

/** The columns of a survey file. */
enum SurveyColumn {
    TAG("tag"),
    MEDIUM("medium"),
    COMPOSITION("composition"),
    FLOW("flow"),
    SUPPLY("supply temperature"),
    LOWEST("lowest temperature"),
    PRESSURE("pressure"),
    HOURS("hours per year"),
    FLOW_UNCERTAINTY("flow uncertainty"),
    TEMPERATURE_UNCERTAINTY("temperature uncertainty"),
    /** Free text; the one column that may be missing. */
    REMARK("remark");

    private static final Vocabulary<SurveyColumn> HEADINGS = headings();

    private final String heading;

    SurveyColumn(String heading) {
        this.heading = heading;
    }

    private static Vocabulary<SurveyColumn> headings() {
        final Vocabulary<SurveyColumn> headings = new Vocabulary<>("column");
        for (SurveyColumn column : values()) {
            headings.with(column.heading, column);
        }
        return headings;
    }

    /** {@return the headings that are understood} */
    static Vocabulary<SurveyColumn> vocabulary() {
        return HEADINGS;
    }

    String heading() {
        return heading;
    }

    boolean isRequired() {
        return this != REMARK;
    }

    /** {@return whether cells hold numbers with units, so that the heading may state the unit} */
    boolean isMeasured() {
        return switch (this) {
            case TAG, MEDIUM, COMPOSITION, REMARK -> false;
            default -> true;
        };
    }

    /** {@return whether cells may hold numbers} */
    boolean mayHoldNumbers() {
        return isMeasured() || this == COMPOSITION;
    }
}
