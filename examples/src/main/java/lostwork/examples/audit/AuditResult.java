package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lostwork.quantity.Energy;
import lostwork.quantity.Mass;
import lostwork.quantity.Money;

/** The figures of all streams, ranked by the work that they are likely to give in a year, most first. */
final class AuditResult {
    private final Site site;
    private final Survey survey;
    private final List<StreamFigures> ranked;
    private final List<Problem> problems;

    /**
     * Ranks the streams.
     *
     * @param site the site
     * @param survey the survey as read
     * @param figures the figures of the streams that could be computed
     * @param problems all problems: of the reading and of the computing
     */
    AuditResult(Site site, Survey survey, List<StreamFigures> figures, List<Problem> problems) {
        this.site = site;
        this.survey = survey;
        final List<StreamFigures> sorted = new ArrayList<>(figures);
        sorted.sort(Comparator.comparing(StreamFigures::likelyWorkPerYear)
                .reversed()
                .thenComparing(figure -> figure.stream().tag()));
        this.ranked = List.copyOf(sorted);
        this.problems = List.copyOf(problems);
    }

    Site site() {
        return site;
    }

    Survey survey() {
        return survey;
    }

    List<StreamFigures> ranked() {
        return ranked;
    }

    List<Problem> problems() {
        return problems;
    }

    /** {@return the sums over all streams} */
    AuditTotals totals() {
        return AuditTotals.of(ranked);
    }

    /** {@return a sentence for each pair of neighbours in the ranking whose ranges overlap} */
    List<String> closeRanks() {
        final List<String> sentences = new ArrayList<>();
        for (int i = 0; i + 1 < ranked.size(); i++) {
            final StreamFigures upper = ranked.get(i);
            final StreamFigures lower = ranked.get(i + 1);
            final boolean both = lower.likelyWork().value().si() > 0;
            if (both && upper.likelyWorkPerYearLow().compareTo(lower.likelyWorkPerYearHigh()) <= 0) {
                sentences.add("Ranks " + (i + 1) + " and " + (i + 2)
                        + " cannot be told apart: their ranges of work in a year overlap.");
            }
        }
        return sentences;
    }

    /** {@return what power of this energy would cost from the grid} */
    Money worth(Energy work) {
        return site.powerPrice().times(work);
    }

    /** {@return what this energy would cost as heat} */
    Money worthAsHeat(Energy heat) {
        return site.heatPrice().times(heat);
    }

    /** {@return the carbon dioxide that the grid emits for this energy} */
    Mass carbonDioxide(Energy work) {
        return site.gridCarbonIntensity().times(work);
    }
}
