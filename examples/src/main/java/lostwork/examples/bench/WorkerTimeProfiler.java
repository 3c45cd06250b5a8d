package lostwork.examples.bench;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadInfo;
import java.lang.management.ThreadMXBean;
import java.util.Collection;
import java.util.List;
import org.openjdk.jmh.infra.BenchmarkParams;
import org.openjdk.jmh.infra.IterationParams;
import org.openjdk.jmh.profile.InternalProfiler;
import org.openjdk.jmh.results.AggregationPolicy;
import org.openjdk.jmh.results.IterationResult;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.ScalarResult;

/**
 * Processor time of the measuring thread per operation.
 *
 * <p>On a machine that others use too, the clock on the wall runs on while a thread waits for its turn; this does not. The
 * threads of the compiler do not count.
 */
public final class WorkerTimeProfiler implements InternalProfiler {
    static final String LABEL = "worker.time";

    private static final String WORKER = "-jmh-worker-";

    private final ThreadMXBean threads = ManagementFactory.getThreadMXBean();
    private long before;

    private long nanoseconds() {
        long sum = 0;
        final long[] ids = threads.getAllThreadIds();
        final ThreadInfo[] infos = threads.getThreadInfo(ids);
        for (int i = 0; i < ids.length; i++) {
            if (infos[i] != null && infos[i].getThreadName().contains(WORKER)) {
                sum += Math.max(0, threads.getThreadCpuTime(ids[i]));
            }
        }
        return sum;
    }

    @Override
    public String getDescription() {
        return "processor time of the measuring thread per operation";
    }

    @Override
    public void beforeIteration(BenchmarkParams benchmark, IterationParams iteration) {
        before = nanoseconds();
    }

    @Override
    public Collection<? extends Result<?>> afterIteration(
            BenchmarkParams benchmark, IterationParams iteration, IterationResult result) {
        final double each =
                (double) (nanoseconds() - before) / result.getMetadata().getAllOps();
        return List.of(new ScalarResult(LABEL, each, "ns/op", AggregationPolicy.AVG));
    }
}
