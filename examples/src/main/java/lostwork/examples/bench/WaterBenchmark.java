package lostwork.examples.bench;

import java.util.concurrent.TimeUnit;
import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.fluid.water.Water;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/**
 * Volume, enthalpy and entropy of IAPWS-IF97 at a temperature and a pressure, against the release transcribed term by
 * term with {@code Math.pow}.
 *
 * <p>The model decides the region and makes all derivatives as well; the transcription makes what v, h and s need in the
 * region that it is told.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class WaterBenchmark {
    /** The region of IAPWS-IF97. */
    @Param({"LIQUID_1", "VAPOUR_2"})
    public SteamStates region = SteamStates.LIQUID_1;

    private final FluidModel model = Water.industrial().model();
    private final If97Transcription transcription = new If97Transcription();
    private final StatePoint point = new StatePoint();
    private StatePoint[] states = region.points();
    private int next;

    /** Draws the states. */
    @Setup
    public void prepare() {
        states = region.points();
    }

    private StatePoint nextState() {
        return states[next++ & SteamStates.MASK];
    }

    /** {@return v, h and s in one number, term by term} */
    @Benchmark
    public double termByTerm() {
        final StatePoint asked = nextState();
        if (region == SteamStates.LIQUID_1) {
            transcription.region1(asked.temperature, asked.pressure);
        } else {
            transcription.region2(asked.temperature, asked.pressure);
        }
        return SteamStates.oneNumber(transcription.volume, transcription.enthalpy, transcription.entropy);
    }

    /** {@return v, h and s in one number, from the model} */
    @Benchmark
    @HeldTo(baseline = "termByTerm", atMost = 0.1, withoutAllocation = true)
    public double model() {
        final StatePoint asked = nextState();
        model.atTemperaturePressure(asked.temperature, asked.pressure, point);
        return SteamStates.oneNumber(point.volume, point.enthalpy, point.entropy);
    }
}
