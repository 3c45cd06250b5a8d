package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import lostwork.quantity.Energy;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** The report of an audit as text. */
final class AuditReport {
    /** Stands where a stream has no figure. */
    private static final Cell NONE = Cell.of("-");

    private final AuditResult result;
    private final RecoveryOutcome recovery;
    private final List<String> lines = new ArrayList<>();

    private AuditReport(AuditResult result, RecoveryOutcome recovery) {
        this.result = result;
        this.recovery = recovery;
    }

    static String of(AuditResult result, RecoveryOutcome recovery) {
        final AuditReport report = new AuditReport(result, recovery);
        report.heading();
        report.streams();
        report.ranking();
        report.lines.addAll(RecoveryReport.lines(result, recovery));
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
        String head = "Result     ";
        for (String line : RecoveryReport.summary(result, recovery)) {
            lines.add(head + line);
            head = " ".repeat(head.length());
        }
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
        final Table.Builder table = Table.builder()
                .words("Stream")
                .words("Medium")
                .numbers("Supply", "°C", 1)
                .numbers("Lowest", "°C", 1)
                .numbers("Heat", "kW", 1)
                .numbers("Exergy", "kW", 1)
                .numbers("Quality", "%", 1)
                .numbers("Most work", "kW", 1);
        for (StreamFigures figures : result.ranked()) {
            table.row(
                    Cell.of(figures.stream().tag()),
                    Cell.of(figures.mediumLabel()),
                    Cell.of(Decimals.shortest(figures.stream().supply().inCelsius())),
                    Cell.of(Decimals.shortest(figures.stream().lowest().inCelsius())),
                    ifAny(figures, kilowatts(figures.heat().value())),
                    figures.exergyAtSupply().map(AuditReport::kilowatts).orElse(NONE),
                    figures.quality().map(AuditReport::percent).orElse(NONE),
                    ifAny(figures, kilowatts(figures.mostWork().value())));
        }
        final AuditTotals totals = result.totals();
        table.row(
                Cell.of("All streams"),
                Cell.none(),
                Cell.none(),
                Cell.none(),
                kilowatts(totals.heat()),
                kilowatts(totals.exergyAtSupply()),
                totals.heat().si() > 0 ? percent(totals.mostWork().over(totals.heat())) : NONE,
                kilowatts(totals.mostWork()));
        lines.add("What leaves, and the most that the second law allows");
        lines.add("");
        lines.add(table.build().toString());
    }

    private void ranking() {
        final String currency = result.site().currency();
        final Table.Builder table = Table.builder()
                .numbers("Rank", "", 0)
                .words("Stream")
                .numbers("Likely work", "kW", 1)
                .numbers("Range", "kW", 1)
                .numbers("Hours", "h/a", 0)
                .numbers("Work", "MWh/a", 0)
                .numbers("As power", currency + "/a", 0)
                .numbers("CO2 spared", "t/a", 0)
                .numbers("Or as heat", currency + "/a", 0);
        int rank = 0;
        for (StreamFigures figures : result.ranked()) {
            rank++;
            final Estimate likely = figures.likelyWork();
            final Energy work = figures.likelyWorkPerYear();
            table.row(
                    ifAny(figures, Cell.of(rank)),
                    Cell.of(figures.stream().tag()),
                    ifAny(figures, kilowatts(likely.value())),
                    ifAny(figures, Cell.of(range(likely))),
                    Cell.of(figures.stream().hoursPerYear().inHours()),
                    Cell.of(work.inMegawattHours()),
                    Cell.of(result.worth(work).amount()),
                    Cell.of(result.carbonDioxide(work).inTonnes()),
                    Cell.of(result.worthAsHeat(figures.heatPerYear()).amount()));
        }
        final AuditTotals totals = result.totals();
        final Energy work = totals.likelyWorkPerYear();
        table.row(
                Cell.none(),
                Cell.of("All streams"),
                kilowatts(totals.likelyWork()),
                Cell.none(),
                Cell.none(),
                Cell.of(work.inMegawattHours()),
                Cell.of(result.worth(work).amount()),
                Cell.of(result.carbonDioxide(work).inTonnes()),
                Cell.of(result.worthAsHeat(totals.heatPerYear()).amount()));
        lines.add("What a machine is likely to give, ranked by its work in a year");
        lines.add("");
        lines.add(table.build().toString());
    }

    private static String range(Estimate estimate) {
        return Decimals.fixed(estimate.low().inKilowatts(), 1) + " to "
                + Decimals.fixed(estimate.high().inKilowatts(), 1);
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
                        AuditRules.MEDIUM,
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

    private static Cell ifAny(StreamFigures figures, Cell cell) {
        return figures.hasHeat() ? cell : NONE;
    }

    private static Cell percent(Ratio ratio) {
        return Cell.of(ratio.inPercent());
    }

    private static Cell kilowatts(Power power) {
        return Cell.of(power.inKilowatts());
    }
}
