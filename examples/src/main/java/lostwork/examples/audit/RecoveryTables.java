package lostwork.examples.audit;

import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import lostwork.examples.recovery.OperatingPoint;
import lostwork.examples.recovery.Recovery;
import lostwork.examples.recovery.RecoveryPlant;
import lostwork.fluid.FluidState;
import lostwork.ledger.ComponentExergy;
import lostwork.ledger.Ledger;
import lostwork.ledger.StreamExergy;
import lostwork.plant.Solution;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** The tables of a recovery plant, for print and for files. */
final class RecoveryTables {
    private final Recovery recovery;
    private final RecoveryPlant plant;
    private final Solution solution;

    RecoveryTables(RecoveryProposal proposal) {
        recovery = proposal.recovery();
        plant = recovery.best().plant();
        solution = recovery.best().solution();
    }

    /** {@return the pressures that were tried} */
    Table pressures() {
        final Table.Builder table = Table.builder()
                .numbers("Evaporation", "bar", 2)
                .numbers("Boiling at", "°C", 1)
                .numbers("Steam", "kg/s", 3)
                .numbers("Gas leaves", "°C", 1)
                .numbers("Pinch", "K", 1)
                .numbers("Vapour at outlet", "%", 1)
                .numbers("Net power", "kW", 1)
                .words("Cooling limited by")
                .words("");
        for (OperatingPoint point : recovery.points()) {
            table.row(
                    Cell.of(point.pressure().inBar()),
                    Cell.of(point.boiling().inCelsius()),
                    Cell.of(point.steamFlow().inKilogramsPerSecond()),
                    Cell.of(point.gasOutlet().inCelsius()),
                    Cell.of(point.pinch().inKelvins()),
                    Cell.of(point.outletVapour().map(Ratio::inPercent).orElse(100.0)),
                    kilowatts(point.netPower()),
                    Cell.of(point.limit().words()),
                    Cell.of(point.equals(recovery.best()) ? "best" : ""));
        }
        return table.build();
    }

    /** {@return the state of every stream} */
    Table states() {
        final Map<String, StreamExergy> exergies =
                recovery.ledger().streams().stream().collect(Collectors.toMap(StreamExergy::from, Function.identity()));
        final Table.Builder table = Table.builder()
                .words("Stream")
                .numbers("Flow", "kg/s", 3)
                .numbers("Temperature", "°C", 1)
                .numbers("Pressure", "bar", 3)
                .numbers("Enthalpy", "kJ/kg", 1)
                .numbers("Entropy", "kJ/(kg K)", 4)
                .numbers("Vapour", "%", 1)
                .numbers("Exergy", "kW", 1);
        for (RecoveryPlant.Stream stream : plant.streams()) {
            final FluidState state = solution.state(stream.outlet());
            table.row(
                    Cell.of(stream.words()),
                    Cell.of(solution.value(stream.outlet().flow()).inKilogramsPerSecond()),
                    Cell.of(state.temperature().inCelsius()),
                    Cell.of(state.pressure().inBar()),
                    Cell.of(state.enthalpy().inKilojoulesPerKilogram()),
                    Cell.of(state.entropy().inKilojoulesPerKilogramKelvin()),
                    Cell.of(state.vapourFraction().map(Ratio::inPercent).orElse(Double.NaN)),
                    kilowatts(exergies.get(stream.outlet().toString()).rate()));
        }
        return table.build();
    }

    /** {@return heat and power of every machine} */
    Table machines() {
        final Table.Builder table =
                Table.builder().words("Machine").words("What").numbers("Rate", "kW", 1);
        machine(table, "boiler", "heat from gas to water", plant.boiler().duty());
        machine(table, "turbine", "shaft power", plant.turbine().power());
        machine(table, "condenser", "heat of the steam", plant.condenser().duty());
        machine(table, "generator", "electric power made", plant.generator().power());
        machine(
                table,
                "feed pump",
                "electric power of its motor",
                plant.pumpMotor().power());
        machine(
                table,
                "draught fan",
                "electric power of its motor",
                plant.fanMotor().power());
        machine(
                table,
                "condenser fans",
                "electric power",
                plant.condenser().fans().power());
        table.row(Cell.of("plant"), Cell.of("net electric power"), kilowatts(recovery.netPower()));
        return table.build();
    }

    private void machine(Table.Builder table, String name, String what, Variable<Power> rate) {
        table.row(Cell.of(name), Cell.of(what), kilowatts(solution.value(rate)));
    }

    /** {@return what every machine destroys} */
    Table ledger() {
        final Ledger ledger = recovery.ledger();
        final Table.Builder table = Table.builder()
                .words("Component")
                .numbers("Takes", "kW", 1)
                .numbers("Makes", "kW", 1)
                .numbers("Destroys", "kW", 1)
                .numbers("Share of all", "%", 1)
                .numbers("Makes/takes", "%", 1);
        for (ComponentExergy component : ledger.ranking()) {
            table.row(
                    Cell.of(component.component()),
                    component.fuel().map(RecoveryTables::kilowatts).orElse(Cell.of("-")),
                    component.product().map(RecoveryTables::kilowatts).orElse(Cell.of("-")),
                    kilowatts(component.destruction()),
                    Cell.of(component.destruction().over(ledger.destruction()).inPercent()),
                    component.efficiency().map(e -> Cell.of(e.inPercent())).orElse(Cell.of("-")));
        }
        table.row(
                Cell.of("plant"),
                kilowatts(ledger.fuel()),
                kilowatts(ledger.product()),
                kilowatts(ledger.destruction()),
                Cell.of(100),
                Cell.of(ledger.efficiency().inPercent()));
        return table.build();
    }

    private static Cell kilowatts(Power power) {
        return Cell.of(power.inKilowatts());
    }
}
