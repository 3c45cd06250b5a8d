package lostwork.process;

import java.util.List;
import lostwork.process.ProcessException.Reason;
import lostwork.quantity.Energy;
import lostwork.quantity.Entropy;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.Units;

/**
 * A chain of steps that comes back to its start: an engine, or with the steps the other way round a refrigerator or heat
 * pump.
 *
 * <p>Heat in is the heat of the steps that take heat in, as textbooks count it; a polytropic step that turns from one to the
 * other on its way counts in parts, so that no cycle seems better than Carnot's. An ideal regenerator, which keeps heat of
 * one step for another, takes that heat out of both counts.
 *
 * <p>Immutable and thread-safe.
 */
public final class ProcessCycle {
    private final ProcessChain chain;
    private final double regeneratedJoules;

    private ProcessCycle(ProcessChain chain, double regeneratedJoules) {
        this.chain = chain;
        this.regeneratedJoules = regeneratedJoules;
    }

    static ProcessCycle of(ProcessChain chain) {
        return new ProcessCycle(chain, 0);
    }

    /**
     * {@return this cycle with an ideal regenerator, which stores the heat that one step gives off and returns it to another}
     *
     * <p>As much heat is kept as both steps have. The mass passes the regenerator in opposite directions, so that each part of
     * it keeps one temperature; nowhere may the receiving step be hotter than the giving one.
     *
     * @param giving the step of this cycle that gives heat off, isochoric or isobaric
     * @param receiving the step of this cycle that takes heat in, isochoric or isobaric
     * @throws ProcessException if a step is of another kind, has heat of the wrong sign, or the heat would flow from the
     *     colder to the hotter side
     * @throws IllegalArgumentException if a step does not belong to this cycle, or the cycle has a regenerator already
     */
    public ProcessCycle withRegenerator(ProcessStep giving, ProcessStep receiving) {
        if (!chain.steps().contains(giving) || !chain.steps().contains(receiving)) {
            throw new IllegalArgumentException("both steps must belong to this cycle; take them from chain().steps()");
        }
        if (regeneratedJoules != 0) {
            throw new IllegalArgumentException("this cycle has a regenerator already");
        }
        return new ProcessCycle(
                chain, chain.closedMass().mass().si() * Regenerator.keptJoulesPerKilogram(giving, receiving));
    }

    /** {@return the steps in order} */
    public List<ProcessStep> steps() {
        return chain.steps();
    }

    /** {@return the chain of steps} */
    public ProcessChain chain() {
        return chain;
    }

    /** {@return the work of all steps: positive for an engine} */
    public Energy netWork() {
        return chain.netWork();
    }

    /** {@return the heat of all steps; equal to the net work} */
    public Energy netHeat() {
        return chain.netHeat();
    }

    /**
     * {@return the area enclosed in the pressure–volume diagram, by quadrature; equal to the net work}
     *
     * @throws lostwork.solve.SolveException if a quadrature does not settle
     */
    public Energy pressureVolumeArea() {
        return chain.pressureVolumeArea();
    }

    /**
     * {@return the area enclosed in the temperature–entropy diagram, by quadrature; equal to the net heat}
     *
     * @throws lostwork.solve.SolveException if a quadrature does not settle
     */
    public Energy temperatureEntropyArea() {
        return chain.temperatureEntropyArea();
    }

    /** {@return the heat taken in from outside: less what a regenerator returns} */
    public Energy heatIn() {
        return Energy.joules(chain.heatIn().si() - regeneratedJoules);
    }

    /** {@return the heat given off to outside, as a positive number, less what a regenerator keeps} */
    public Energy heatOut() {
        return Energy.joules(chain.heatOut().si() - regeneratedJoules);
    }

    /** {@return the heat that a regenerator moves from one step to another; zero without one} */
    public Energy regeneratedHeat() {
        return Energy.joules(regeneratedJoules);
    }

    /**
     * {@return the thermal efficiency of an engine: net work per heat taken in}
     *
     * @throws ProcessException if the cycle does no work
     */
    public Ratio thermalEfficiency() {
        requireEngine();
        return netWork().over(heatIn());
    }

    /**
     * {@return the coefficient of performance of a refrigerator: heat taken in per work consumed}
     *
     * @throws ProcessException if the cycle consumes no work
     */
    public Ratio refrigeratorCop() {
        requireConsumer();
        return heatIn().over(netWork().negated());
    }

    /**
     * {@return the coefficient of performance of a heat pump: heat given off per work consumed}
     *
     * @throws ProcessException if the cycle consumes no work
     */
    public Ratio heatPumpCop() {
        requireConsumer();
        return heatOut().over(netWork().negated());
    }

    private void requireEngine() {
        if (!(netWork().si() > 0)) {
            throw new ProcessException(
                    Reason.DIRECTION,
                    "net work = " + netWork() + ": this cycle is no engine and has no thermal efficiency; ask for"
                            + " refrigeratorCop() or heatPumpCop(), or take the steps the other way round");
        }
    }

    private void requireConsumer() {
        if (!(netWork().si() < 0)) {
            throw new ProcessException(
                    Reason.DIRECTION,
                    "net work = " + netWork()
                            + ": this cycle consumes no work and has no coefficient of performance; ask"
                            + " for thermalEfficiency(), or take the steps the other way round");
        }
    }

    /** {@return the net work per swept volume, the difference between the largest and the smallest volume} */
    public PressureDifference meanEffectivePressure() {
        double smallest = chain.start().volume().si();
        double largest = smallest;
        for (ProcessStep step : chain.steps()) {
            smallest = Math.min(smallest, step.to().volume().si());
            largest = Math.max(largest, step.to().volume().si());
        }
        return PressureDifference.pascals(
                netWork().si() / (chain.closedMass().mass().si() * (largest - smallest)));
    }

    /** {@return the highest temperature of the cycle} */
    public Temperature hottest() {
        return Temperature.kelvin(chain.steps().stream()
                .mapToDouble(ProcessStep::hottestKelvin)
                .max()
                .orElseThrow());
    }

    /** {@return the lowest temperature of the cycle} */
    public Temperature coldest() {
        return Temperature.kelvin(chain.steps().stream()
                .mapToDouble(ProcessStep::coldestKelvin)
                .min()
                .orElseThrow());
    }

    /**
     * {@return the entropy generated per cycle when all heat taken in comes from one reservoir and all heat given off goes to
     * another: {@code Qout/Tsink − Qin/Tsource}}
     *
     * <p>The work lost by it is {@link lostwork.exergy.GouyStodola#lostWork(Entropy, lostwork.exergy.ReferenceEnvironment)}.
     *
     * @param source the temperature of the reservoir that heat comes from
     * @param sink the temperature of the reservoir that heat goes to
     * @throws ProcessException if a step would exchange its heat against the difference of temperature
     */
    public Entropy entropyGenerationBetween(Temperature source, Temperature sink) {
        if (regeneratedJoules == 0) {
            for (ProcessStep step : chain.steps()) {
                step.requireDownhill(step.specificHeat().si() > 0 ? source : sink);
            }
        }
        return Entropy.ofHeat(heatOut(), sink).minus(Entropy.ofHeat(heatIn(), source));
    }

    /** {@return states, steps and the figures of the cycle, in aligned columns with units} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder(chain.toString()).append('\n');
        text.append("net work ").append(netWork()).append(", heat in ").append(heatIn());
        text.append(", heat out ").append(heatOut());
        if (regeneratedJoules != 0) {
            text.append(", regenerated ").append(regeneratedHeat());
        }
        text.append('\n');
        if (netWork().si() > 0) {
            text.append("thermal efficiency ").append(thermalEfficiency().format(Units.PERCENT, 4));
            text.append(", mean effective pressure ").append(meanEffectivePressure());
        } else if (netWork().si() < 0) {
            text.append("COP as refrigerator ").append(refrigeratorCop());
            text.append(", as heat pump ").append(heatPumpCop());
        }
        return text.append('\n').toString();
    }
}
