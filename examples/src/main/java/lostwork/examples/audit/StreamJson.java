package lostwork.examples.audit;

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
                .put("likelyWorkRule", AuditRules.LIKELY_WORK)
                .put("uncertaintyRule", AuditRules.UNCERTAINTY)
                .put("caution", AuditRules.CAUTION)
                .closeObject()
                .toString();
    }

    private static void site(JsonText json, Site site) {
        json.openObject("site")
                .put("name", site.name())
                .put("ambientTemperature_C", site.ambientTemperature().inCelsius())
                .put("ambientPressure_mbar", site.ambientPressure().inMbar())
                .put("relativeHumidity_percent", site.relativeHumidity().inPercent())
                .put("currency", site.currency())
                .put("powerPrice_perMWh", site.powerPrice().inPerMegawattHour())
                .put("heatPrice_perMWh", site.heatPrice().inPerMegawattHour())
                .put(
                        "gridCarbonIntensity_kg_per_MWh",
                        site.gridCarbonIntensity().inKilogramsPerMegawattHour())
                .closeObject();
    }

    private static void totals(JsonText json, AuditTotals totals) {
        json.openObject("allStreams")
                .put("heat_kW", totals.heat().inKilowatts())
                .put("exergyAtSupply_kW", totals.exergyAtSupply().inKilowatts())
                .put("mostWork_kW", totals.mostWork().inKilowatts())
                .put("likelyWork_kW", totals.likelyWork().inKilowatts())
                .put("heatPerYear_MWh", totals.heatPerYear().inMegawattHours())
                .put("likelyWorkPerYear_MWh", totals.likelyWorkPerYear().inMegawattHours())
                .closeObject();
    }

    private static void stream(JsonText json, AuditResult result, StreamFigures figures, int rank) {
        final SurveyLine stream = figures.stream();
        json.openElement()
                .put("rank", rank)
                .put("tag", stream.tag())
                .put("medium", figures.mediumLabel())
                .put("massFlow_kg_per_s", figures.massFlow().inKilogramsPerSecond())
                .put("supplyTemperature_C", stream.supply().inCelsius())
                .put("lowestAllowedTemperature_C", stream.lowest().inCelsius())
                .put("countedDownTo_C", figures.lowestCounted().inCelsius())
                .put("pressure_bar", stream.pressure().inBar());
        estimate(json, "heat", figures.heat());
        figures.exergyAtSupply()
                .ifPresentOrElse(
                        exergy -> json.put("exergyAtSupply_kW", exergy.inKilowatts()),
                        () -> json.putNull("exergyAtSupply_kW"));
        figures.quality()
                .ifPresentOrElse(
                        quality -> json.put("meanExergeticQuality_percent", quality.inPercent()),
                        () -> json.putNull("meanExergeticQuality_percent"));
        estimate(json, "mostWork", figures.mostWork());
        estimate(json, "likelyWork", figures.likelyWork());
        json.put("hoursPerYear", stream.hoursPerYear().inHours())
                .put("heatPerYear_MWh", figures.heatPerYear().inMegawattHours())
                .put("likelyWorkPerYear_MWh", figures.likelyWorkPerYear().inMegawattHours())
                .put(
                        "worthOfWorkPerYear",
                        result.worth(figures.likelyWorkPerYear()).amount())
                .put(
                        "carbonDioxideSparedPerYear_t",
                        result.carbonDioxide(figures.likelyWorkPerYear()).inTonnes())
                .put(
                        "worthOfHeatPerYear",
                        result.worthAsHeat(figures.heatPerYear()).amount())
                .openArray("notes");
        figures.notes().forEach(json::element);
        json.closeArray().closeObject();
    }

    private static void estimate(JsonText json, String name, Estimate estimate) {
        json.put(name + "_kW", estimate.value().inKilowatts())
                .put(name + "Uncertainty_kW", estimate.uncertainty().inKilowatts());
    }
}
