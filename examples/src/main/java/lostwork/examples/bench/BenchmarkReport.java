package lostwork.examples.bench;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.Main;
import org.openjdk.jmh.infra.BenchmarkParams;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.CommandLineOptionException;
import org.openjdk.jmh.runner.options.CommandLineOptions;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.TimeValue;

/**
 * Runs benchmarks in rounds and prints how each compares with its baseline, in processor time of the measuring thread.
 */
public final class BenchmarkReport {
    private static final int DEFAULT_ROUNDS = 2;
    /** A method that allocates nothing still shares a few bytes of the harness. */
    private static final double NO_ALLOCATION_BYTES = 0.5;

    private static final String ALLOCATION = "gc.alloc.rate.norm";

    /** Time and allocation of each benchmark in one round, by name and parameters. */
    private record Measured(double time, double bytes) {}

    private final List<Map<String, Measured>> rounds = new ArrayList<>();

    private BenchmarkReport() {}

    /**
     * Runs the benchmarks that the arguments name.
     *
     * @param arguments options of JMH; {@code -f} is the number of rounds
     */
    public static void main(String[] arguments) throws Exception {
        final CommandLineOptions options;
        try {
            options = new CommandLineOptions(arguments);
        } catch (CommandLineOptionException e) {
            System.err.println(e.getMessage());
            System.exit(2);
            return;
        }
        if (options.shouldHelp()
                || options.shouldList()
                || options.shouldListWithParams()
                || options.shouldListProfilers()
                || options.shouldListResultFormats()) {
            Main.main(arguments);
            return;
        }
        final BenchmarkReport report = new BenchmarkReport();
        final int count = options.getForkCount().orElse(DEFAULT_ROUNDS);
        for (int round = 1; round <= count; round++) {
            System.out.printf(Locale.ROOT, "# Round %d of %d%n", round, count);
            report.run(options);
        }
        report.print(System.out);
    }

    private void run(CommandLineOptions options) throws RunnerException {
        final var builder = new OptionsBuilder()
                .parent(options)
                .forks(1)
                .warmupIterations(options.getWarmupIterations().orElse(3))
                .warmupTime(options.getWarmupTime().orElse(TimeValue.milliseconds(400)))
                .measurementIterations(options.getMeasurementIterations().orElse(3))
                .measurementTime(options.getMeasurementTime().orElse(TimeValue.milliseconds(300)))
                .jvmArgsPrepend("-Xms1g", "-Xmx1g", "-XX:+AlwaysPreTouch", "-XX:+UseSerialGC");
        builder.addProfiler(GCProfiler.class).addProfiler(WorkerTimeProfiler.class);
        final Collection<RunResult> results = new Runner(builder.build()).run();
        final Map<String, Measured> round = new LinkedHashMap<>();
        for (RunResult result : results) {
            final BenchmarkParams params = result.getParams();
            final Map<String, ?> secondary = result.getSecondaryResults();
            round.put(
                    params.getBenchmark() + " " + parameters(params),
                    new Measured(score(secondary, WorkerTimeProfiler.LABEL), score(secondary, ALLOCATION)));
        }
        rounds.add(round);
    }

    private static double score(Map<String, ?> results, String label) {
        return results.get(label) instanceof Result<?> result ? result.getScore() : Double.NaN;
    }

    private static String parameters(BenchmarkParams params) {
        final StringBuilder text = new StringBuilder();
        for (String key : params.getParamsKeys()) {
            text.append(text.isEmpty() ? "" : ", ").append(params.getParam(key));
        }
        return text.toString();
    }

    private void print(PrintStream out) throws ReflectiveOperationException {
        out.printf("%nMedians over %d rounds; in brackets the lowest and highest ratio of a round.%n", rounds.size());
        out.printf(
                "%-34s %-22s %10s %8s %8s  %-15s %-8s%n", "benchmark", "case", "ns/op", "B/op", "ratio", "", "held to");
        for (String key : rounds.get(0).keySet()) {
            final String name = key.substring(0, key.indexOf(' '));
            final String parameters = key.substring(name.length() + 1);
            final int dot = name.lastIndexOf('.');
            final Class<?> type = Class.forName(name.substring(0, dot));
            final HeldTo heldTo = type.getMethod(name.substring(dot + 1)).getAnnotation(HeldTo.class);
            final double bytes = median(
                    rounds.stream().mapToDouble(round -> round.get(key).bytes).toArray());
            out.printf(
                    Locale.ROOT,
                    "%-34s %-22s %10.2f %8.0f",
                    type.getSimpleName().replace("Benchmark", "") + "." + name.substring(dot + 1),
                    parameters,
                    median(rounds.stream()
                            .mapToDouble(round -> round.get(key).time)
                            .toArray()),
                    bytes);
            final String baseline =
                    heldTo == null ? "" : name.substring(0, dot + 1) + heldTo.baseline() + " " + parameters;
            if (heldTo != null && rounds.get(0).containsKey(baseline)) {
                final double[] ratios = rounds.stream()
                        .mapToDouble(round -> round.get(key).time / round.get(baseline).time)
                        .sorted()
                        .toArray();
                out.printf(
                        Locale.ROOT, " %8.3f  %-15s %s", median(ratios), range(ratios), verdict(heldTo, ratios, bytes));
            }
            out.println();
        }
    }

    private static String range(double[] sorted) {
        return String.format(Locale.ROOT, "(%.3f..%.3f)", sorted[0], sorted[sorted.length - 1]);
    }

    private static String verdict(HeldTo heldTo, double[] ratios, double bytes) {
        final StringBuilder text = new StringBuilder();
        boolean met = true;
        if (heldTo.atMost() < Double.POSITIVE_INFINITY) {
            text.append(String.format(Locale.ROOT, "%.2f of %s", heldTo.atMost(), heldTo.baseline()));
            met = median(ratios) <= heldTo.atMost();
        } else {
            text.append("reported, against ").append(heldTo.baseline());
        }
        if (heldTo.withoutAllocation()) {
            text.append(", 0 B");
            met &= !(bytes > NO_ALLOCATION_BYTES);
        }
        return text + (met ? "" : "   MISSED");
    }

    private static double median(double[] values) {
        final double[] sorted = values.clone();
        Arrays.sort(sorted);
        final int middle = sorted.length / 2;
        return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
    }
}
