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
 * The inverse calls of water against one forward evaluation at the same states.
 *
 * <p>Forward is by temperature and pressure, in the two-phase region by pressure and vapour fraction.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
public class WaterFlashBenchmark {
    /** The region of IAPWS-IF97. */
    @Param
    public SteamStates region = SteamStates.LIQUID_1;

    private final FluidModel model = Water.industrial().model();
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

    private double result() {
        return SteamStates.oneNumber(point.volume, point.enthalpy, point.entropy);
    }

    /** {@return the state forward} */
    @Benchmark
    public double forward() {
        final StatePoint asked = nextState();
        if (region == SteamStates.WET_4) {
            model.atPressureVapourFraction(asked.pressure, asked.vapourFraction, point);
        } else {
            model.atTemperaturePressure(asked.temperature, asked.pressure, point);
        }
        return result();
    }

    /** {@return the state by pressure and enthalpy} */
    @Benchmark
    @HeldTo(baseline = "forward", atMost = 3, withoutAllocation = true)
    public double byPressureEnthalpy() {
        final StatePoint asked = nextState();
        model.atPressureEnthalpy(asked.pressure, asked.enthalpy, point);
        return result();
    }

    /** {@return the state by pressure and entropy} */
    @Benchmark
    @HeldTo(baseline = "forward", withoutAllocation = true)
    public double byPressureEntropy() {
        final StatePoint asked = nextState();
        model.atPressureEntropy(asked.pressure, asked.entropy, point);
        return result();
    }
}
