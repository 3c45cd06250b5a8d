package lostwork.process;

import lostwork.fluid.FluidState;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** Chains as tables. */
final class ChainTables {
    private ChainTables() {}

    static Table states(ProcessChain chain) {
        final Table.Builder table = Table.builder()
                .numbers("state", "", 0)
                .numbers("T", "°C", 2)
                .numbers("p", "bar", 4)
                .numbers("v", "m³/kg", 6)
                .numbers("u", "kJ/kg", 2)
                .numbers("s", "kJ/(kg K)", 4)
                .numbers("x", "", 4)
                .words("phase");
        int number = 1;
        row(table, number, chain.start());
        for (ProcessStep step : chain.steps()) {
            number++;
            row(table, number, step.to());
        }
        return table.build();
    }

    private static void row(Table.Builder table, int number, FluidState state) {
        table.row(
                Cell.of(number),
                Cell.of(state.temperature().inCelsius()),
                Cell.of(state.pressure().inBar()),
                Cell.of(state.volume().inCubicMetresPerKilogram()),
                Cell.of(state.internalEnergy().inKilojoulesPerKilogram()),
                Cell.of(state.entropy().inKilojoulesPerKilogramKelvin()),
                state.vapourFraction().map(x -> Cell.of(x.si())).orElse(Cell.none()),
                Cell.of(state.phase().toString()));
    }

    static Table steps(ProcessChain chain) {
        final Table.Builder table = Table.builder()
                .words("step")
                .words("process")
                .numbers("work out", "kJ", 3)
                .numbers("heat in", "kJ", 3)
                .numbers("ΔU", "kJ", 3)
                .numbers("ΔS", "kJ/K", 5)
                .numbers("ΔV", "m³", 6);
        int number = 1;
        for (ProcessStep step : chain.steps()) {
            table.row(
                    Cell.of(number + " to " + (number + 1)),
                    Cell.of(step.label()),
                    Cell.of(step.work().inKilojoules()),
                    Cell.of(step.heat().inKilojoules()),
                    Cell.of(step.energyChange().inKilojoules()),
                    Cell.of(step.entropyChange().inKilojoulesPerKelvin()),
                    Cell.of(step.volumeChange().inCubicMetres()));
            number++;
        }
        table.row(
                Cell.of("net"),
                Cell.of(""),
                Cell.of(chain.netWork().inKilojoules()),
                Cell.of(chain.netHeat().inKilojoules()),
                Cell.of(chain.energyChange().inKilojoules()),
                Cell.of(chain.entropyChange().inKilojoulesPerKelvin()),
                Cell.of(chain.volumeChange().inCubicMetres()));
        return table.build();
    }
}
