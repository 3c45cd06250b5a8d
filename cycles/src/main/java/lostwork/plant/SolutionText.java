package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Prints a solution as aligned tables. */
final class SolutionText {
    private SolutionText() {}

    static String of(Solution solution) {
        final StringBuilder text = new StringBuilder();
        text.append("Solution of plant \"").append(solution.plant().name()).append("\"\n\n");
        states(solution, text);
        machines(solution, text);
        assumptions(solution, text);
        closure(solution, text);
        return text.toString();
    }

    private static void states(Solution solution, StringBuilder text) {
        final Plant plant = solution.plant();
        final List<String[]> rows = new ArrayList<>();
        rows.add(new String[] {"stream", "fluid", "kg/s", "°C", "bar", "kJ/kg", "kJ/(kg K)", "vapour"});
        for (Plant.Connection connection : plant.connections()) {
            if (connection.from() instanceof Outlet outlet) {
                final double x = solution.si(plant.slotOf(outlet.vapourFraction()));
                rows.add(new String[] {
                    connection.from() + " → " + connection.to(),
                    plant.resolution().modelAt(outlet).name(),
                    number("%.4f", solution.value(outlet.flow()).si()),
                    number("%.2f", solution.value(outlet.temperature()).inCelsius()),
                    number("%.4f", solution.value(outlet.pressure()).inBar()),
                    number("%.2f", solution.value(outlet.enthalpy()).inKilojoulesPerKilogram()),
                    number("%.4f", solution.value(outlet.entropy()).inKilojoulesPerKilogramKelvin()),
                    Double.isNaN(x) ? "" : number("%.4f", x)
                });
            }
        }
        TextTable.append(rows, 2, text);
        text.append('\n');
    }

    private static void machines(Solution solution, StringBuilder text) {
        final List<String[]> rows = new ArrayList<>();
        rows.add(new String[] {"component", "variable", "value", ""});
        for (Component component : solution.plant().components()) {
            for (Port port : component.ports()) {
                if (port instanceof ShaftPort shaft) {
                    row(solution, shaft.power(), rows);
                } else if (port instanceof WirePort wire) {
                    row(solution, wire.power(), rows);
                } else if (port instanceof HeatPort heat) {
                    row(solution, heat.rate(), rows);
                }
            }
            component.variables().forEach(v -> row(solution, v, rows));
        }
        TextTable.append(rows, 2, text);
        text.append('\n');
    }

    private static void row(Solution solution, Variable<?> variable, List<String[]> rows) {
        if (solution.hasValue(variable)) {
            rows.add(new String[] {
                variable.component(),
                variable.name(),
                solution.value(variable).toString(),
                solution.plan().isGiven(solution.plant().slotOf(variable)) ? "given" : ""
            });
        }
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

    private static String number(String format, double value) {
        return String.format(Locale.ROOT, format, value);
    }
}
