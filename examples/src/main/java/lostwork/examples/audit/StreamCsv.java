package lostwork.examples.audit;

import lostwork.quantity.Energy;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** The figures of the streams as separated text (RFC 4180, but with line feeds): commas, decimal points, UTF-8. */
final class StreamCsv {
    private StreamCsv() {}

    static String of(AuditResult result) {
        final String currency = result.site().currency();
        final Table.Builder table = Table.builder()
                .numbers("rank", "", 0)
                .words("tag")
                .words("medium")
                .numbers("mass flow", "kg/s", 4)
                .numbers("supply temperature", "°C", 2)
                .numbers("lowest allowed temperature", "°C", 2)
                .numbers("lowest counted temperature", "°C", 2)
                .numbers("pressure", "bar", 4)
                .numbers("heat rejected", "kW", 2)
                .numbers("heat uncertainty", "kW", 2)
                .numbers("exergy at supply", "kW", 2)
                .numbers("mean exergetic quality", "%", 2)
                .numbers("most work", "kW", 2)
                .numbers("most work uncertainty", "kW", 2)
                .numbers("likely work", "kW", 2)
                .numbers("likely work uncertainty", "kW", 2)
                .numbers("hours per year", "h", 0)
                .numbers("heat per year", "MWh", 1)
                .numbers("likely work per year", "MWh", 1)
                .numbers("worth of work per year", currency, 0)
                .numbers("CO2 spared per year", "t", 1)
                .numbers("worth of heat per year", currency, 0)
                .words("notes");
        int rank = 0;
        for (StreamFigures figures : result.ranked()) {
            rank++;
            table.row(cells(result, figures, rank));
        }
        return table.build().toCsv();
    }

    private static Cell[] cells(AuditResult result, StreamFigures figures, int rank) {
        final SurveyLine stream = figures.stream();
        final Energy work = figures.likelyWorkPerYear();
        return new Cell[] {
            Cell.of(Integer.toString(rank)),
            Cell.of(stream.tag()),
            Cell.of(figures.mediumLabel()),
            Cell.of(figures.massFlow().inKilogramsPerSecond()),
            Cell.of(stream.supply().inCelsius()),
            Cell.of(stream.lowest().inCelsius()),
            Cell.of(figures.lowestCounted().inCelsius()),
            Cell.of(stream.pressure().inBar()),
            kilowatts(figures.heat().value()),
            kilowatts(figures.heat().uncertainty()),
            figures.exergyAtSupply().map(StreamCsv::kilowatts).orElse(Cell.none()),
            figures.quality().map(Ratio::inPercent).map(Cell::of).orElse(Cell.none()),
            kilowatts(figures.mostWork().value()),
            kilowatts(figures.mostWork().uncertainty()),
            kilowatts(figures.likelyWork().value()),
            kilowatts(figures.likelyWork().uncertainty()),
            Cell.of(stream.hoursPerYear().inHours()),
            Cell.of(figures.heatPerYear().inMegawattHours()),
            Cell.of(work.inMegawattHours()),
            Cell.of(result.worth(work).amount()),
            Cell.of(result.carbonDioxide(work).inTonnes()),
            Cell.of(result.worthAsHeat(figures.heatPerYear()).amount()),
            Cell.of(String.join("; ", figures.notes()))
        };
    }

    private static Cell kilowatts(Power power) {
        return Cell.of(power.inKilowatts());
    }
}
