package lostwork.ledger;

import java.util.Locale;
import lostwork.quantity.Power;
import lostwork.report.JsonText;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** The tables of a ledger, and their print, CSV and JSON. */
final class LedgerTables {
    private final Ledger ledger;

    LedgerTables(Ledger ledger) {
        this.ledger = ledger;
    }

    Table components() {
        final Table.Builder table = Table.builder()
                .words("component")
                .numbers("fuel", "kW", 2)
                .numbers("product", "kW", 2)
                .numbers("destruction", "kW", 2)
                .numbers("T0 Sgen", "kW", 2)
                .numbers("difference", "W", 6)
                .numbers("share", "%", 1)
                .numbers("efficiency", "%", 1);
        final double total = ledger.destruction().si();
        for (ComponentExergy c : ledger.ranking()) {
            table.row(
                    Cell.of(c.component()),
                    c.fuel().map(LedgerTables::kilowatts).orElse(Cell.none()),
                    c.product().map(LedgerTables::kilowatts).orElse(Cell.none()),
                    kilowatts(c.destruction()),
                    kilowatts(c.destructionByEntropy()),
                    Cell.of(c.difference().si()),
                    Cell.of(total == 0 ? Double.NaN : 100 * c.destruction().si() / total),
                    c.efficiency().map(e -> Cell.of(e.inPercent())).orElse(Cell.none()));
        }
        return table.build();
    }

    Table streams() {
        final Table.Builder table = Table.builder()
                .words("stream")
                .numbers("flow", "kg/s", 4)
                .numbers("thermal", "kJ/kg", 3)
                .numbers("mechanical", "kJ/kg", 3)
                .numbers("exergy", "kJ/kg", 3)
                .numbers("exergy rate", "kW", 2);
        for (StreamExergy s : ledger.streams()) {
            table.row(
                    Cell.of(s.from() + " → " + s.to()),
                    Cell.of(s.flow().si()),
                    Cell.of(s.thermal().inKilojoulesPerKilogram()),
                    Cell.of(s.mechanical().inKilojoulesPerKilogram()),
                    Cell.of(s.specific().inKilojoulesPerKilogram()),
                    kilowatts(s.rate()));
        }
        return table.build();
    }

    Table boundary() {
        final Table.Builder table = Table.builder()
                .words("across the boundary")
                .words("")
                .words("role")
                .numbers("exergy rate", "kW", 2);
        for (BoundaryExergy b : ledger.boundary()) {
            table.row(
                    Cell.of(b.port()),
                    Cell.of(b.enters() ? "in" : "out"),
                    Cell.of(b.role().toString()),
                    kilowatts(b.rate()));
        }
        return table.build();
    }

    private static Cell kilowatts(Power power) {
        return Cell.of(power.inKilowatts());
    }

    String toText() {
        final StringBuilder text = new StringBuilder();
        text.append("Exergy ledger of plant \"")
                .append(ledger.solution().plant().name())
                .append("\", environment ")
                .append(ledger.environment())
                .append("\n\n");
        text.append(components()).append('\n');
        text.append(streams()).append('\n');
        text.append(boundary()).append('\n');
        text.append(String.format(
                Locale.ROOT,
                "Fuel %.2f kW = product %.2f kW + loss %.2f kW + destruction %.2f kW%s%nClosure: %.1e of the fuel%n",
                ledger.fuel().inKilowatts(),
                ledger.product().inKilowatts(),
                ledger.loss().inKilowatts(),
                ledger.destruction().inKilowatts(),
                hasFuel()
                        ? String.format(
                                Locale.ROOT,
                                "; exergetic efficiency %.2f %%",
                                ledger.efficiency().inPercent())
                        : "",
                hasFuel() ? ledger.closure().si() : Double.NaN));
        ledger.notes().forEach(note -> text.append(note).append('\n'));
        return text.toString();
    }

    private boolean hasFuel() {
        return ledger.fuel().si() > 0;
    }

    String toJson() {
        final JsonText json = new JsonText();
        json.openObject().put("plant", ledger.solution().plant().name());
        json.openObject("environment")
                .put("temperature in K", ledger.environment().temperature().inKelvin())
                .put("pressure in Pa", ledger.environment().pressure().inPascal())
                .closeObject();
        components().writeJson(json, "components");
        streams().writeJson(json, "streams");
        boundary().writeJson(json, "boundary");
        json.openObject("totals in kW")
                .put("fuel", ledger.fuel().inKilowatts())
                .put("product", ledger.product().inKilowatts())
                .put("loss", ledger.loss().inKilowatts())
                .put("destruction", ledger.destruction().inKilowatts())
                .put("gap", ledger.gap().inKilowatts())
                .closeObject();
        json.openArray("notes");
        ledger.notes().forEach(json::element);
        return json.closeArray().closeObject().toString();
    }
}
