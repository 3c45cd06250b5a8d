package lostwork.examples.audit;

import lostwork.examples.recovery.Assumption;
import lostwork.examples.recovery.Recovery;
import lostwork.quantity.Energy;
import lostwork.report.JsonText;

/** The recovery plant as JSON; each name carries its unit. */
final class RecoveryJson {
    private RecoveryJson() {}

    static String of(AuditResult result, RecoveryProposal proposal) {
        final Recovery recovery = proposal.recovery();
        final StreamFigures figures = proposal.figures();
        final RecoveryTables tables = new RecoveryTables(proposal);
        final Energy year = proposal.perYear();
        final String currency = result.site().currency();
        final JsonText json = new JsonText()
                .openObject()
                .put("stream", figures.stream().tag())
                .put("evaporation pressure in bar", recovery.best().pressure().inBar())
                .put("cooling limited by", recovery.best().limit().words())
                .put("net power in kW", proposal.net().value().inKilowatts())
                .put("net power uncertainty in kW", proposal.net().uncertainty().inKilowatts())
                .put("most work in kW", figures.mostWork().value().inKilowatts())
                .put("likely work in kW", figures.likelyWork().value().inKilowatts())
                .put("hours per year", figures.stream().hoursPerYear().inHours())
                .put("energy per year in MWh", year.inMegawattHours())
                .put("worth per year in " + currency, result.worth(year).amount())
                .put("CO2 spared per year in t", result.carbonDioxide(year).inTonnes());
        json.openArray("findings");
        recovery.findings().forEach(json::element);
        json.closeArray();
        tables.states().writeJson(json, "streams");
        tables.machines().writeJson(json, "machines");
        tables.pressures().writeJson(json, "pressures");
        json.openArray("assumptions");
        for (Assumption<?> assumption : recovery.assumptions()) {
            json.openElement()
                    .put("name", assumption.name())
                    .put("value", assumption.text())
                    .put("basis", assumption.basis())
                    .closeObject();
        }
        return json.closeArray()
                .put("caution", AuditRules.CAUTION)
                .closeObject()
                .toString();
    }
}
