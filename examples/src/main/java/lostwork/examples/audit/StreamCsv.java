package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;

/** The figures of the streams as separated text (RFC 4180, but with line feeds): commas, decimal points, UTF-8. */
final class StreamCsv {
    private StreamCsv() {}

    static String of(AuditResult result) {
        final String currency = result.site().currency();
        final StringBuilder text = new StringBuilder();
        text.append(line(List.of(
                "rank",
                "tag",
                "medium",
                "mass flow [kg/s]",
                "supply temperature [°C]",
                "lowest allowed temperature [°C]",
                "counted down to [°C]",
                "pressure [bar]",
                "heat rejected [kW]",
                "heat uncertainty [kW]",
                "exergy at supply [kW]",
                "mean exergetic quality [%]",
                "most work [kW]",
                "most work uncertainty [kW]",
                "likely work [kW]",
                "likely work uncertainty [kW]",
                "hours per year [h]",
                "heat per year [MWh]",
                "likely work per year [MWh]",
                "worth of work per year [" + currency + "]",
                "CO2 spared per year [t]",
                "worth of heat per year [" + currency + "]",
                "notes")));
        int rank = 0;
        for (StreamFigures figures : result.ranked()) {
            rank++;
            text.append(line(cells(result, figures, rank)));
        }
        return text.toString();
    }

    private static List<String> cells(AuditResult result, StreamFigures figures, int rank) {
        final SurveyLine stream = figures.stream();
        final List<String> cells = new ArrayList<>();
        cells.add(Integer.toString(rank));
        cells.add(stream.tag());
        cells.add(figures.mediumLabel());
        cells.add(number(figures.massFlow().inKilogramsPerSecond()));
        cells.add(number(stream.supply().inCelsius()));
        cells.add(number(stream.lowest().inCelsius()));
        cells.add(number(figures.lowestCounted().inCelsius()));
        cells.add(number(stream.pressure().inBar()));
        cells.add(number(figures.heat().value().inKilowatts()));
        cells.add(number(figures.heat().uncertainty().inKilowatts()));
        cells.add(figures.exergyAtSupply().map(x -> number(x.inKilowatts())).orElse(""));
        cells.add(figures.quality().map(q -> number(q.inPercent())).orElse(""));
        cells.add(number(figures.mostWork().value().inKilowatts()));
        cells.add(number(figures.mostWork().uncertainty().inKilowatts()));
        cells.add(number(figures.likelyWork().value().inKilowatts()));
        cells.add(number(figures.likelyWork().uncertainty().inKilowatts()));
        cells.add(number(stream.hoursPerYear().inHours()));
        cells.add(number(figures.heatPerYear().inMegawattHours()));
        cells.add(number(figures.likelyWorkPerYear().inMegawattHours()));
        cells.add(number(result.worth(figures.likelyWorkPerYear()).amount()));
        cells.add(number(result.carbonDioxide(figures.likelyWorkPerYear()).inTonnes()));
        cells.add(number(result.worthAsHeat(figures.heatPerYear()).amount()));
        cells.add(String.join("; ", figures.notes()));
        return cells;
    }

    private static String number(double value) {
        return Decimals.shortest(value);
    }

    private static String line(List<String> cells) {
        final List<String> quoted = new ArrayList<>();
        for (String cell : cells) {
            quoted.add(
                    cell.indexOf(',') >= 0 || cell.indexOf('"') >= 0 ? '"' + cell.replace("\"", "\"\"") + '"' : cell);
        }
        return String.join(",", quoted) + "\n";
    }
}
