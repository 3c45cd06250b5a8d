package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import lostwork.examples.audit.TextTable.Alignment;
import lostwork.examples.audit.TextTable.Column;
import lostwork.quantity.Energy;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/** The report of an audit as text. */
final class AuditReport {
    /** Stands where a stream has no figure. */
    private static final String NONE = "-";

    private final AuditResult result;
    private final List<String> lines = new ArrayList<>();

    private AuditReport(AuditResult result) {
        this.result = result;
    }

    static String of(AuditResult result) {
        final AuditReport report = new AuditReport(result);
        report.heading();
        report.streams();
        report.ranking();
        report.notes();
        report.rules();
        return String.join("\n", report.lines) + "\n";
    }

    private void heading() {
        final Site site = result.site();
        lines.add("Waste-heat audit: " + site.name());
        lines.add("");
        lines.add("Ambient    " + site.ambientTemperature() + ", "
                + Decimals.shortest(site.ambientPressure().inMbar())
                + " mbar, " + Decimals.shortest(site.relativeHumidity().inPercent()) + " % relative humidity");
        lines.add("Prices     power "
                + Decimals.shortest(site.powerPrice().inPerMegawattHour()) + " " + site.currency() + "/MWh, heat "
                + Decimals.shortest(site.heatPrice().inPerMegawattHour()) + " " + site.currency() + "/MWh; grid "
                + Decimals.shortest(site.gridCarbonIntensity().inKilogramsPerMegawattHour()) + " kg CO2/MWh");
        lines.add("Survey     " + result.survey().file() + ": "
                + count(result.ranked().size(), "stream") + " used, "
                + count(refusedLines(), "line") + " refused"
                + (result.problems().isEmpty() ? "" : ", see the end of this report"));
        result.survey().remarks().forEach(remark -> lines.add("           " + remark));
        lines.add("");
    }

    private int refusedLines() {
        return (int)
                result.problems().stream().mapToInt(Problem::line).distinct().count();
    }

    private static String count(int count, String noun) {
        return count + " " + noun + (count == 1 ? "" : "s");
    }

    private void streams() {
        final TextTable table = new TextTable(List.of(
                new Column("Stream", "", Alignment.LEFT),
                new Column("Medium", "", Alignment.LEFT),
                new Column("Supply", "°C", Alignment.RIGHT),
                new Column("Lowest", "°C", Alignment.RIGHT),
                new Column("Heat", "kW", Alignment.RIGHT),
                new Column("Exergy", "kW", Alignment.RIGHT),
                new Column("Quality", "%", Alignment.RIGHT),
                new Column("Most work", "kW", Alignment.RIGHT)));
        for (StreamFigures figures : result.ranked()) {
            table.add(
                    figures.stream().tag(),
                    figures.mediumLabel(),
                    Decimals.shortest(figures.stream().supply().inCelsius()),
                    Decimals.shortest(figures.stream().lowest().inCelsius()),
                    ifAny(figures, kilowatts(figures.heat().value())),
                    figures.exergyAtSupply().map(AuditReport::kilowatts).orElse(NONE),
                    figures.quality().map(AuditReport::percent).orElse(NONE),
                    ifAny(figures, kilowatts(figures.mostWork().value())));
        }
        final AuditTotals totals = result.totals();
        table.add(
                "All streams",
                "",
                "",
                "",
                kilowatts(totals.heat()),
                kilowatts(totals.exergyAtSupply()),
                totals.heat().si() > 0 ? percent(totals.mostWork().over(totals.heat())) : NONE,
                kilowatts(totals.mostWork()));
        lines.add("What leaves, and the most that the second law allows");
        lines.add("");
        lines.addAll(table.lines());
        lines.add("");
    }

    private void ranking() {
        final String currency = result.site().currency();
        final TextTable table = new TextTable(List.of(
                new Column("Rank", "", Alignment.RIGHT),
                new Column("Stream", "", Alignment.LEFT),
                new Column("Likely work", "kW", Alignment.RIGHT),
                new Column("Range", "kW", Alignment.RIGHT),
                new Column("Hours", "h/a", Alignment.RIGHT),
                new Column("Work", "MWh/a", Alignment.RIGHT),
                new Column("As power", currency + "/a", Alignment.RIGHT),
                new Column("CO2 spared", "t/a", Alignment.RIGHT),
                new Column("Or as heat", currency + "/a", Alignment.RIGHT)));
        int rank = 0;
        for (StreamFigures figures : result.ranked()) {
            rank++;
            final Estimate likely = figures.likelyWork();
            final List<String> cells = new ArrayList<>(List.of(
                    figures.hasHeat() ? Integer.toString(rank) : NONE,
                    figures.stream().tag(),
                    ifAny(figures, kilowatts(likely.value())),
                    ifAny(figures, kilowatts(likely.low()) + " to " + kilowatts(likely.high())),
                    whole(figures.stream().hoursPerYear().inHours())));
            cells.addAll(yearly(figures.likelyWorkPerYear(), figures.heatPerYear()));
            table.add(cells);
        }
        final AuditTotals totals = result.totals();
        final List<String> sums = new ArrayList<>(List.of("", "All streams", kilowatts(totals.likelyWork()), "", ""));
        sums.addAll(yearly(totals.likelyWorkPerYear(), totals.heatPerYear()));
        table.add(sums);
        lines.add("What a machine is likely to give, ranked by its work in a year");
        lines.add("");
        lines.addAll(table.lines());
        lines.add("");
    }

    private List<String> yearly(Energy work, Energy heat) {
        return List.of(
                whole(work.inMegawattHours()),
                whole(result.worth(work).amount()),
                whole(result.carbonDioxide(work).inTonnes()),
                whole(result.worthAsHeat(heat).amount()));
    }

    private void notes() {
        final List<String> notes = new ArrayList<>();
        for (StreamFigures figures : result.ranked()) {
            figures.notes().forEach(note -> notes.add(figures.stream().tag() + ": " + note + "."));
        }
        result.closeRanks().forEach(notes::add);
        paragraphs("Notes", notes);
    }

    private void rules() {
        paragraphs(
                "How the figures are made",
                List.of(
                        AuditRules.HEAT,
                        AuditRules.EXERGY,
                        AuditRules.MOST_WORK,
                        AuditRules.QUALITY,
                        AuditRules.LIKELY_WORK,
                        AuditRules.UNCERTAINTY,
                        AuditRules.WORTH));
        paragraphs("Caution", List.of(AuditRules.CAUTION));
        paragraphs(
                "Refused lines",
                result.problems().stream().map(Problem::toString).toList());
        lines.remove(lines.size() - 1);
    }

    private void paragraphs(String title, List<String> texts) {
        if (!texts.isEmpty()) {
            lines.add(title);
            texts.forEach(text -> lines.add(Paragraph.wrap("- " + text)));
            lines.add("");
        }
    }

    private static String ifAny(StreamFigures figures, String text) {
        return figures.hasHeat() ? text : NONE;
    }

    private static String percent(Ratio ratio) {
        return Decimals.fixed(ratio.inPercent(), 1);
    }

    private static String whole(double value) {
        return Decimals.fixed(value, 0);
    }

    private static String kilowatts(Power power) {
        return Decimals.fixed(power.inKilowatts(), 1);
    }
}
