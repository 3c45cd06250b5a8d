package lostwork.plant;

import java.util.List;
import java.util.Locale;
import lostwork.quantity.Unit;
import lostwork.report.JsonText;
import lostwork.report.Table;
import lostwork.report.Table.Cell;

/** Prints a solution as aligned tables. */
final class SolutionText {
    private SolutionText() {}

    static String of(Solution solution) {
        final StringBuilder text = new StringBuilder();
        text.append("Solution of plant \"").append(solution.plant().name()).append("\"\n\n");
        text.append(streams(solution)).append('\n');
        machines(solution, text);
        assumptions(solution, text);
        closure(solution, text);
        return text.toString();
    }

    /** The streams, a line each. */
    static Table streams(Solution solution) {
        final Plant plant = solution.plant();
        final Table.Builder table = Table.builder()
                .words("stream")
                .words("fluid")
                .numbers("flow", "kg/s", 4)
                .numbers("temperature", "°C", 2)
                .numbers("pressure", "bar", 4)
                .numbers("enthalpy", "kJ/kg", 2)
                .numbers("entropy", "kJ/(kg K)", 4)
                .numbers("vapour", "", 4);
        for (Plant.Connection connection : plant.connections()) {
            if (connection.from() instanceof Outlet outlet) {
                table.row(
                        Cell.of(connection.from() + " → " + connection.to()),
                        Cell.of(plant.resolution().modelAt(outlet).name()),
                        Cell.of(solution.value(outlet.flow()).si()),
                        Cell.of(solution.value(outlet.temperature()).inCelsius()),
                        Cell.of(solution.value(outlet.pressure()).inBar()),
                        Cell.of(solution.value(outlet.enthalpy()).inKilojoulesPerKilogram()),
                        Cell.of(solution.value(outlet.entropy()).inKilojoulesPerKilogramKelvin()),
                        Cell.of(solution.si(plant.slotOf(outlet.vapourFraction()))));
            }
        }
        return table.build();
    }

    private static void machines(Solution solution, StringBuilder text) {
        final Table.Builder table = Table.builder()
                .words("component")
                .words("variable")
                .words("value")
                .words("");
        for (Component component : solution.plant().components()) {
            for (Port port : component.ports()) {
                if (port instanceof ShaftPort shaft) {
                    row(solution, shaft.power(), table);
                } else if (port instanceof WirePort wire) {
                    row(solution, wire.power(), table);
                } else if (port instanceof HeatPort heat) {
                    row(solution, heat.rate(), table);
                }
            }
            component.variables().forEach(v -> row(solution, v, table));
        }
        solution.plant().definitions().keySet().stream()
                .filter(v -> v.component().equals(solution.plant().name()))
                .forEach(v -> row(solution, v, table));
        text.append(table.build()).append('\n');
    }

    private static void row(Solution solution, Variable<?> variable, Table.Builder table) {
        if (solution.hasValue(variable)) {
            table.row(
                    Cell.of(variable.component()),
                    Cell.of(variable.name()),
                    Cell.of(solution.value(variable).toString()),
                    Cell.of(solution.plan().isGiven(solution.plant().slotOf(variable)) ? "given" : ""));
        }
    }

    /** The values at shafts, wires and heat ports and those of the components, as numbers with their units. */
    static Table values(Solution solution) {
        final Table.Builder table = Table.builder()
                .words("component")
                .words("variable")
                .numbers("value", "", 6)
                .words("unit")
                .words("given");
        for (Component component : solution.plant().components()) {
            for (Port port : component.ports()) {
                if (port instanceof ShaftPort shaft) {
                    number(solution, shaft.power(), table);
                } else if (port instanceof WirePort wire) {
                    number(solution, wire.power(), table);
                } else if (port instanceof HeatPort heat) {
                    number(solution, heat.rate(), table);
                    number(solution, heat.temperature(), table);
                }
            }
            component.variables().forEach(v -> number(solution, v, table));
        }
        solution.plant().definitions().keySet().stream()
                .filter(v -> v.component().equals(solution.plant().name()))
                .forEach(v -> number(solution, v, table));
        return table.build();
    }

    private static void number(Solution solution, Variable<?> variable, Table.Builder table) {
        if (solution.hasValue(variable)) {
            final Unit<?> unit = variable.kind().displayUnit();
            table.row(
                    Cell.of(variable.component()),
                    Cell.of(variable.name()),
                    Cell.of(unit.fromSi(solution.si(solution.plant().slotOf(variable)))),
                    Cell.of(unit.symbol()),
                    Cell.of(solution.plan().isGiven(solution.plant().slotOf(variable)) ? "given" : ""));
        }
    }

    static String toJson(Solution solution) {
        final JsonText json = new JsonText();
        json.openObject().put("plant", solution.plant().name());
        streams(solution).writeJson(json, "streams");
        values(solution).writeJson(json, "values");
        words(json, "assumed", solution.plan().assumptions());
        words(
                json,
                "not assumed, since given values say otherwise",
                solution.plan().assumptionsGivenWay());
        final Closure closure = solution.closure();
        json.openObject("closure")
                .put("mass", closure.mass())
                .put("energy", closure.energy())
                .put("largest scaled residual", solution.largestResidual())
                .closeObject();
        json.openArray("findings");
        solution.violations().forEach(json::element);
        return json.closeArray().closeObject().toString();
    }

    private static void words(JsonText json, String name, List<Equation> equations) {
        json.openArray(name);
        equations.forEach(e -> json.element(e.words()));
        json.closeArray();
    }

    private static void assumptions(Solution solution, StringBuilder text) {
        text.append("Assumed: ")
                .append(list(solution.plan().assumptions().stream()
                        .map(Equation::words)
                        .toList()))
                .append("\n");
        if (!solution.plan().assumptionsGivenWay().isEmpty()) {
            text.append("Not assumed, since given values say otherwise: ")
                    .append(list(solution.plan().assumptionsGivenWay().stream()
                            .map(Equation::words)
                            .toList()))
                    .append("\n");
        }
    }

    private static String list(List<String> words) {
        return words.isEmpty() ? "nothing" : String.join("; ", words);
    }

    private static void closure(Solution solution, StringBuilder text) {
        final Closure closure = solution.closure();
        text.append(String.format(
                Locale.ROOT,
                "Closure: mass %.1e of the largest flow, energy %.1e of the largest; largest scaled residual %.1e%n",
                closure.mass(),
                closure.energy(),
                solution.largestResidual()));
        solution.violations().forEach(v -> text.append("Finding: ").append(v).append('\n'));
    }
}
