package lostwork.examples.bench;

import java.util.concurrent.TimeUnit;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.fluid.water.Water;
import lostwork.plant.Solution;
import lostwork.plant.SolveOptions;
import lostwork.plant.Specification;
import lostwork.quantity.Pressure;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/**
 * What the solver costs beside the fluid: a warm solve of a steam plant of ten components against the calls of the fluid
 * that it makes.
 *
 * <p>The solve starts from the solution at another live steam pressure and includes the checks of the result. Its calls of
 * the fluid are recorded once and replayed in the same order with the same arguments; since solves are reproducible, they
 * are those of every solve. A total of twice the replay means that the solver takes as long as the fluid.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class PlantBenchmark {
    private static final Pressure FROM = Pressure.bar(80);
    private static final Pressure TO = Pressure.bar(84);

    private final FluidModel model = Water.industrial().model();
    private final StatePoint point = new StatePoint();
    private final SteamPlant plant = new SteamPlant(Water.industrial());
    private Specification target = at(plant, TO);
    private SolveOptions warm = SolveOptions.defaults();
    private RecordingModel.Call[] calls = {};

    /** Solves for the start and records the calls of the fluid. */
    @Setup
    public void prepare() {
        warm = SolveOptions.defaults().startingFrom(at(plant, FROM).solve());
        target = at(plant, TO);
        target.plan();
        final RecordingModel recording = new RecordingModel(model);
        final SteamPlant recorded = new SteamPlant(Fluid.of(recording));
        final Solution start = at(recorded, FROM).solve();
        final Specification recordedTarget = at(recorded, TO);
        recordedTarget.plan();
        recording.forget();
        recordedTarget.solve(SolveOptions.defaults().startingFrom(start));
        calls = recording.calls().toArray(RecordingModel.Call[]::new);
    }

    private static Specification at(SteamPlant plant, Pressure livePressure) {
        return plant.design().with(plant.livePressure(), livePressure);
    }

    /** {@return the power in W after a warm solve} */
    @Benchmark
    @HeldTo(baseline = "fluidCalls", atMost = 2, otherResult = true)
    public double warmSolve() {
        return target.solve(warm).value(plant.power()).si();
    }

    /** {@return the power in W after a solve without a start} */
    @Benchmark
    @HeldTo(baseline = "fluidCalls", otherResult = true)
    public double coldSolve() {
        return target.solve().value(plant.power()).si();
    }

    /** {@return a sum over the calls of the fluid that a warm solve makes} */
    @Benchmark
    public double fluidCalls() {
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            throw new IllegalStateException("water without saturation");
        }
        double sum = 0;
        for (RecordingModel.Call call : calls) {
            sum += call.replay(model, saturation, point);
        }
        return sum;
    }
}
