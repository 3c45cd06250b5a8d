package lostwork.examples.audit;

import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.report.JsonText;

/** The figures of the audit as JSON; each name carries its unit. */
final class StreamJson {
    private StreamJson() {}

    static String of(AuditResult result) {
        final JsonText json = new JsonText().openObject();
        site(json, result.site());
        json.openArray("streams");
        int rank = 0;
        for (StreamFigures figures : result.ranked()) {
            rank++;
            stream(json, result, figures, rank);
        }
        json.closeArray();
        totals(json, result.totals());
        json.openArray("refused");
        for (Problem problem : result.problems()) {
            json.openElement()
                    .put("file", problem.file())
                    .put("line", problem.line())
                    .put("column", problem.column())
                    .put("what", problem.what())
                    .put("accepted", problem.accepted())
                    .closeObject();
        }
        return json.closeArray()
                .put("rule of the likely work", AuditRules.LIKELY_WORK)
                .put("rule of the uncertainty", AuditRules.UNCERTAINTY)
                .put("caution", AuditRules.CAUTION)
                .closeObject()
                .toString();
    }

    private static void site(JsonText json, Site site) {
        json.openObject("site")
                .put("name", site.name())
                .put("ambient temperature in °C", site.ambientTemperature().inCelsius())
                .put("ambient pressure in mbar", site.ambientPressure().inMbar())
                .put("relative humidity in %", site.relativeHumidity().inPercent())
                .put("currency", site.currency())
                .put(
                        "power price in " + site.currency() + "/MWh",
                        site.powerPrice().inPerMegawattHour())
                .put(
                        "heat price in " + site.currency() + "/MWh",
                        site.heatPrice().inPerMegawattHour())
                .put(
                        "grid carbon intensity in kg/MWh",
                        site.gridCarbonIntensity().inKilogramsPerMegawattHour())
                .closeObject();
    }

    private static void totals(JsonText json, AuditTotals totals) {
        json.openObject("all streams")
                .put("heat in kW", totals.heat().inKilowatts())
                .put("exergy at supply in kW", totals.exergyAtSupply().inKilowatts())
                .put("most work in kW", totals.mostWork().inKilowatts())
                .put("likely work in kW", totals.likelyWork().inKilowatts())
                .put("heat per year in MWh", totals.heatPerYear().inMegawattHours())
                .put("likely work per year in MWh", totals.likelyWorkPerYear().inMegawattHours())
                .closeObject();
    }

    private static void stream(JsonText json, AuditResult result, StreamFigures figures, int rank) {
        final SurveyLine stream = figures.stream();
        json.openElement()
                .put("rank", rank)
                .put("tag", stream.tag())
                .put("medium", figures.mediumLabel())
                .put("mass flow in kg/s", figures.massFlow().inKilogramsPerSecond())
                .put("supply temperature in °C", stream.supply().inCelsius())
                .put("lowest allowed temperature in °C", stream.lowest().inCelsius())
                .put("lowest counted temperature in °C", figures.lowestCounted().inCelsius())
                .put("pressure in bar", stream.pressure().inBar());
        estimate(json, "heat", figures.heat());
        json.put(
                        "exergy at supply in kW",
                        figures.exergyAtSupply().map(Power::inKilowatts).orElse(Double.NaN))
                .put(
                        "mean exergetic quality in %",
                        figures.quality().map(Ratio::inPercent).orElse(Double.NaN));
        estimate(json, "most work", figures.mostWork());
        estimate(json, "likely work", figures.likelyWork());
        json.put("hours per year", stream.hoursPerYear().inHours())
                .put("heat per year in MWh", figures.heatPerYear().inMegawattHours())
                .put("likely work per year in MWh", figures.likelyWorkPerYear().inMegawattHours())
                .put(
                        "worth of work per year in " + result.site().currency(),
                        result.worth(figures.likelyWorkPerYear()).amount())
                .put(
                        "CO2 spared per year in t",
                        result.carbonDioxide(figures.likelyWorkPerYear()).inTonnes())
                .put(
                        "worth of heat per year in " + result.site().currency(),
                        result.worthAsHeat(figures.heatPerYear()).amount())
                .openArray("notes");
        figures.notes().forEach(json::element);
        json.closeArray().closeObject();
    }

    private static void estimate(JsonText json, String name, Estimate estimate) {
        json.put(name + " in kW", estimate.value().inKilowatts())
                .put(name + " uncertainty in kW", estimate.uncertainty().inKilowatts());
    }
}
