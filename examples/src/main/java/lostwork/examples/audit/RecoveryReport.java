package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lostwork.examples.recovery.Assumption;
import lostwork.examples.recovery.OperatingPoint;
import lostwork.examples.recovery.Recovery;
import lostwork.examples.recovery.RecoveryPlant;
import lostwork.ledger.Ledger;
import lostwork.plant.Sensitivities;
import lostwork.quantity.Energy;
import lostwork.quantity.Money;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** The part of the report about the recovery plant. */
final class RecoveryReport {
    private final AuditResult result;
    private final RecoveryOutcome outcome;
    private final List<String> lines = new ArrayList<>();

    private RecoveryReport(AuditResult result, RecoveryOutcome outcome) {
        this.result = result;
        this.outcome = outcome;
    }

    static List<String> lines(AuditResult result, RecoveryOutcome outcome) {
        final RecoveryReport report = new RecoveryReport(result, outcome);
        outcome.proposal().ifPresentOrElse(report::plant, report::noPlant);
        return report.lines;
    }

    /** {@return the outcome in short lines} */
    static List<String> summary(AuditResult result, RecoveryOutcome outcome) {
        return outcome.proposal()
                .map(proposal -> List.of(
                        "a steam plant on " + proposal.figures().stream().tag() + " would give "
                                + whole(proposal.net().value().inKilowatts()) + " kW net ("
                                + whole(proposal.net().low().inKilowatts()) + " to "
                                + whole(proposal.net().high().inKilowatts()) + " kW),",
                        "in a year " + whole(proposal.perYear().inMegawattHours()) + " MWh, worth "
                                + money(result.worth(proposal.perYear())) + " "
                                + result.site().currency() + ", and "
                                + whole(result.carbonDioxide(proposal.perYear()).inTonnes())
                                + " t of CO2 spared"))
                .orElse(List.of("no stream is suitable for a steam plant; see why below"));
    }

    private void noPlant() {
        lines.add("Recovery plant: none");
        lines.add("");
        if (outcome.passedOver().isEmpty()) {
            paragraph("No stream is a gas with heat to give, so no steam plant is looked for.");
        } else {
            paragraph("No stream is suitable for a steam plant:");
            outcome.passedOver().forEach(sentence -> paragraph("- " + sentence));
        }
        lines.add("");
    }

    private void plant(RecoveryProposal proposal) {
        final RecoveryTables tables = new RecoveryTables(proposal);
        final Recovery recovery = proposal.recovery();
        final String tag = proposal.figures().stream().tag();
        lines.add("Recovery plant: steam set on " + tag);
        lines.add("");
        outcome.passedOver().forEach(sentence -> paragraph("Passed over: " + sentence));
        paragraph(tag
                + " is the highest in the ranking that suits a steam plant: boiler, turbine with generator, air-cooled"
                + " condenser and feed pump, and a draught fan that makes up for the pressure loss of the gas. Net power is"
                + " what the generator makes less what the motors and fans take.");
        lines.add("");
        lines.add("Evaporation pressure and net power (" + recovery.evaluations() + " pressures tried)");
        lines.add("");
        lines.add(tables.pressures().toString());
        paragraph(
                "- Pinch is the least temperature difference between gas and water in the boiler. A plant is limited by"
                        + " the pinch, by the lowest temperature that the gas may have, or by both.");
        recovery.findings().forEach(finding -> paragraph("- " + finding));
        lines.add("");
        lines.add("Streams of the plant at " + bar(recovery.best()) + " bar");
        lines.add("");
        lines.add(tables.states().toString());
        lines.add("Machines");
        lines.add("");
        lines.add(tables.machines().toString());
        ledger(tables, recovery);
        gains(proposal);
        assumptions(recovery);
    }

    private void ledger(RecoveryTables tables, Recovery recovery) {
        final Ledger ledger = recovery.ledger();
        lines.add("Exergy ledger: where the work is lost");
        lines.add("");
        lines.add(tables.ledger().toString());
        paragraph("The gas gives up " + one(ledger.fuel().inKilowatts()) + " kW of exergy = "
                + one(ledger.product().inKilowatts()) + " kW net power + "
                + one(ledger.destruction().inKilowatts()) + " kW destroyed + "
                + one(ledger.loss().inKilowatts()) + " kW lost with heat that leaves at ambient temperature. Each"
                + " destruction is computed twice, as what exergy enters and does not leave, and as T0 times the entropy"
                + " generated. The books close within "
                + String.format(Locale.ROOT, "%.0e", ledger.closure().si()) + " of the exergy that the gas gives up.");
        lines.add("");
    }

    private void gains(RecoveryProposal proposal) {
        final StreamFigures figures = proposal.figures();
        final double net = proposal.net().value().inKilowatts();
        final Table.Builder table = Table.builder()
                .words("What it gives")
                .numbers("Value", "", 0)
                .numbers("Range", "", 0)
                .words("Unit");
        row(
                table,
                "net electric power",
                net,
                proposal.net().low().inKilowatts(),
                proposal.net().high().inKilowatts(),
                "kW");
        final Energy year = proposal.perYear();
        final Energy low = proposal.perYearLow();
        final Energy high = proposal.perYearHigh();
        final String hours = whole(figures.stream().hoursPerYear().inHours());
        row(
                table,
                "energy in " + hours + " hours a year",
                year.inMegawattHours(),
                low.inMegawattHours(),
                high.inMegawattHours(),
                "MWh/a");
        table.row(
                Cell.of("worth at the power price"),
                Cell.of(money(result.worth(year))),
                Cell.of(money(result.worth(low)) + " to " + money(result.worth(high))),
                Cell.of(result.site().currency() + "/a"));
        row(
                table,
                "CO2 that the grid is spared",
                result.carbonDioxide(year).inTonnes(),
                result.carbonDioxide(low).inTonnes(),
                result.carbonDioxide(high).inTonnes(),
                "t/a");
        lines.add("What the plant gives");
        lines.add("");
        lines.add(table.build().toString());
        final double most = figures.mostWork().value().inKilowatts();
        final double likely = figures.likelyWork().value().inKilowatts();
        paragraph("- Of the " + one(most)
                + " kW that the second law allows between supply and lowest temperature the plant"
                + " makes " + one(100 * net / most) + " %. The ranking's rule for a likely machine said " + one(likely)
                + " kW; the plant gives " + one(100 * net / likely)
                + " % of that. The rule knows neither fans nor the losses of a turbine of this size.");
        paragraph("- The same gas sold as heat down to its lowest temperature would be worth "
                + money(result.worthAsHeat(figures.heatPerYear())) + " "
                + result.site().currency()
                + " a year, if somebody takes it.");
        paragraph("- " + uncertainty(proposal));
        lines.add("");
    }

    private String uncertainty(RecoveryProposal proposal) {
        final OperatingPoint best = proposal.recovery().best();
        final RecoveryPlant plant = best.plant();
        final Sensitivities slopes = best.solution().sensitivities(plant.netPower());
        final double perPercent =
                slopes.to(plant.gasFlow()).si() * proposal.figures().massFlow().si() / 100 / 1000;
        final double perKelvin = slopes.to(plant.gasInlet()).si() / 1000;
        return "Range: 1 % more gas gives " + one(perPercent) + " kW, gas hotter by 1 K gives " + one(perKelvin)
                + " kW (exact derivatives of the solved plant). With the uncertainties of the survey, combined as in the"
                + " ranking, this is the range. The assumptions below, composition and prices are not part of it.";
    }

    private static void row(Table.Builder table, String what, double value, double low, double high, String unit) {
        table.row(Cell.of(what), Cell.of(value), Cell.of(whole(low) + " to " + whole(high)), Cell.of(unit));
    }

    private void assumptions(Recovery recovery) {
        final Table.Builder table =
                Table.builder().words("Assumed").numbers("Value", "", 1).words("Where it comes from");
        for (Assumption<?> assumption : recovery.assumptions()) {
            table.row(Cell.of(assumption.name()), Cell.of(assumption.text()), Cell.of(assumption.basis()));
        }
        lines.add("Assumptions of the plant");
        lines.add("");
        lines.add(table.build().toString());
        paragraph(
                "- Left out: pressure losses of water and steam, heat losses, blow-down, deaerator, start-up and standstill,"
                        + " and the price of the plant. Feed water enters the boiler as cold as the condensate; where cold tubes would"
                        + " make acid or water condense from the gas, it must be preheated.");
        lines.add("");
    }

    private void paragraph(String text) {
        lines.add(Paragraph.wrap(text));
    }

    private static String bar(OperatingPoint point) {
        return one(point.pressure().inBar());
    }

    private static String one(double value) {
        return Decimals.fixed(value, 1);
    }

    /** Money of an estimate to three digits. */
    private static String money(Money money) {
        return Decimals.significant(money.amount(), 3);
    }

    private static String whole(double value) {
        return Decimals.fixed(value, 0);
    }
}
