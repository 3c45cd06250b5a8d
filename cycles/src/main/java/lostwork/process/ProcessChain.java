package lostwork.process;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FlashException;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.UndefinedPropertyException;
import lostwork.process.ProcessException.Reason;
import lostwork.quantity.Energy;
import lostwork.quantity.Entropy;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import lostwork.quantity.Volume;
import lostwork.report.Table;
import lostwork.solve.SolveException;

/**
 * Reversible steps of a closed mass one after the other, each starting where the last one ended.
 *
 * <p>Each method returns a longer chain and leaves this one as it is. The type of the argument tells how the end is
 * given: a pressure, a temperature, a volume (of the mass, or per mass), a ratio to the start, or a heat. A chain may
 * stop anywhere; {@link #closed} and {@link #closedBy} make it a cycle.
 *
 * <p>Signs: heat into the mass and work out of it are positive.
 *
 * <pre>{@code
 * var stroke = ClosedMass.of(Water.industrial(), kilograms(0.2))
 *         .startingAt(celsius(300), bar(10))
 *         .isentropicTo(expansionRatio(6));
 * stroke.netWork();                       // more than a cycle back to the start would leave
 * stroke.usefulWork(environment);         // less what pushes the surroundings back
 * }</pre>
 *
 * <p>Immutable and thread-safe.
 */
public final class ProcessChain {
    /** How far the end may be from the start of a closed chain, relative: the tolerance of flashes with margin. */
    private static final double CLOSED = 1e-8;

    private final ClosedMass closedMass;
    private final FluidState start;
    private final List<ProcessStep> steps;

    private ProcessChain(ClosedMass closedMass, FluidState start, List<ProcessStep> steps) {
        this.closedMass = closedMass;
        this.start = start;
        this.steps = steps;
    }

    static ProcessChain startingAt(ClosedMass closedMass, FluidState start) {
        return new ProcessChain(closedMass, start, List.of());
    }

    private ProcessChain then(ProcessKind kind, double exponent, Object asked, Supplier<FluidState> end) {
        try {
            final ProcessStep step = ProcessStep.between(kind, exponent, closedMass.mass(), end(), end.get());
            final List<ProcessStep> longer = new ArrayList<>(steps);
            longer.add(step);
            return new ProcessChain(closedMass, start, List.copyOf(longer));
        } catch (OutOfRangeException | FlashException | UndefinedPropertyException | SolveException refusal) {
            throw new ProcessException(
                    Reason.END_NOT_REACHED,
                    describe(kind, asked) + " is not possible: " + refusal.getMessage(),
                    refusal);
        }
    }

    private ProcessChain then(ProcessKind kind, Object asked, Supplier<FluidState> end) {
        return then(kind, Double.NaN, asked, end);
    }

    private String describe(ProcessKind kind, Object asked) {
        return "step " + (steps.size() + 1) + ", " + kind + " from " + OpenChainException.point(end())
                + (asked instanceof HeatAsked ? " with " : " to ") + asked;
    }

    /** A heat as the end of a step, for messages. */
    private record HeatAsked(SpecificEnergy heat) {
        @Override
        public String toString() {
            return heat + " of heat";
        }
    }

    private Fluid fluid() {
        return closedMass.fluid();
    }

    private Pressure scaled(PressureRatio ratio) {
        return Pressure.pascal(end().pressure().si() * ratio.endPerStart());
    }

    private SpecificVolume scaled(VolumeRatio ratio) {
        return end().volume().times(ratio.endPerStart());
    }

    private SpecificVolume perMass(Volume volume) {
        return volume.over(closedMass.mass());
    }

    private SpecificEnergy perMass(Energy energy) {
        return energy.over(closedMass.mass());
    }

    /** A pressure and a temperature on the saturation line leave open how much has evaporated. */
    private void requireOffSaturation(ProcessKind kind, Temperature temperature, Pressure pressure, Object asked) {
        final var saturation = fluid().model().saturation();
        if (saturation != null
                && temperature.si() >= saturation.lowestTemperature()
                && temperature.si() <= saturation.criticalTemperature()
                && Math.abs(pressure.si() / saturation.pressure(temperature.si()) - 1) <= 1e-9) {
            throw new ProcessException(
                    Reason.END_NOT_DETERMINED,
                    describe(kind, asked)
                            + " has no definite end: there liquid and vapour coexist in any proportion; give"
                            + " the vapour fraction, the volume or the heat instead");
        }
    }

    /**
     * {@return this chain and an isothermal step to a pressure}
     *
     * @param pressure the absolute pressure at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid or, on the saturation line, is
     *     not told by the value
     */
    public ProcessChain isothermalTo(Pressure pressure) {
        requireOffSaturation(ProcessKind.ISOTHERMAL, end().temperature(), pressure, pressure);
        return then(ProcessKind.ISOTHERMAL, pressure, () -> fluid().state(end().temperature(), pressure));
    }

    /**
     * {@return this chain and an isothermal step to a multiple of the pressure}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid or, on the saturation line, is
     *     not told by the value
     */
    public ProcessChain isothermalTo(PressureRatio ratio) {
        return isothermalTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isothermal step to a volume per mass}
     *
     * @param volume the specific volume at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalTo(SpecificVolume volume) {
        return then(ProcessKind.ISOTHERMAL, volume, () -> fluid().state(end().temperature(), volume));
    }

    /**
     * {@return this chain and an isothermal step to a volume}
     *
     * @param volume the volume of the mass at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalTo(Volume volume) {
        return isothermalTo(perMass(volume));
    }

    /**
     * {@return this chain and an isothermal step to a multiple of the volume}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalTo(VolumeRatio ratio) {
        return isothermalTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isothermal step to a vapour fraction}
     *
     * @param vapourFraction mass of vapour per total mass at the end, 0 to 1
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalTo(Ratio vapourFraction) {
        return then(
                ProcessKind.ISOTHERMAL,
                "vapour fraction " + vapourFraction,
                () -> fluid().state(end().temperature(), vapourFraction));
    }

    /**
     * {@return this chain and an isothermal step that takes in a heat per mass}
     *
     * @param heat the heat per mass, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalAdding(SpecificEnergy heat) {
        return then(ProcessKind.ISOTHERMAL, new HeatAsked(heat), () -> IsothermalHeating.end(end(), heat.si()));
    }

    /**
     * {@return this chain and an isothermal step that takes in a heat}
     *
     * @param heat the heat, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isothermalAdding(Energy heat) {
        return isothermalAdding(perMass(heat));
    }

    /**
     * {@return this chain and an isentropic step to a pressure}
     *
     * @param pressure the absolute pressure at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(Pressure pressure) {
        return then(ProcessKind.ISENTROPIC, pressure, () -> fluid().state(pressure, end().entropy()));
    }

    /**
     * {@return this chain and an isentropic step to a multiple of the pressure}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(PressureRatio ratio) {
        return isentropicTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isentropic step to a volume per mass}
     *
     * @param volume the specific volume at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(SpecificVolume volume) {
        return then(ProcessKind.ISENTROPIC, volume, () -> fluid().state(volume, end().entropy()));
    }

    /**
     * {@return this chain and an isentropic step to a volume}
     *
     * @param volume the volume of the mass at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(Volume volume) {
        return isentropicTo(perMass(volume));
    }

    /**
     * {@return this chain and an isentropic step to a multiple of the volume}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(VolumeRatio ratio) {
        return isentropicTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isentropic step to a temperature}
     *
     * @param temperature the temperature at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isentropicTo(Temperature temperature) {
        return then(ProcessKind.ISENTROPIC, temperature, () -> fluid().state(temperature, end().entropy()));
    }

    /**
     * {@return this chain and an isochoric step to a pressure}
     *
     * @param pressure the absolute pressure at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isochoricTo(Pressure pressure) {
        return then(ProcessKind.ISOCHORIC, pressure, () -> fluid().state(pressure, end().volume()));
    }

    /**
     * {@return this chain and an isochoric step to a multiple of the pressure}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isochoricTo(PressureRatio ratio) {
        return isochoricTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isochoric step to a temperature}
     *
     * @param temperature the temperature at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isochoricTo(Temperature temperature) {
        return then(ProcessKind.ISOCHORIC, temperature, () -> fluid().state(temperature, end().volume()));
    }

    /**
     * {@return this chain and an isochoric step that takes in a heat per mass}
     *
     * @param heat the heat per mass, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isochoricAdding(SpecificEnergy heat) {
        return then(
                ProcessKind.ISOCHORIC,
                new HeatAsked(heat),
                () -> fluid().state(end().internalEnergy().plus(heat), end().volume()));
    }

    /**
     * {@return this chain and an isochoric step that takes in a heat}
     *
     * @param heat the heat, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isochoricAdding(Energy heat) {
        return isochoricAdding(perMass(heat));
    }

    /**
     * {@return this chain and an isobaric step to a temperature}
     *
     * @param temperature the temperature at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid or, on the saturation line, is
     *     not told by the value
     */
    public ProcessChain isobaricTo(Temperature temperature) {
        requireOffSaturation(ProcessKind.ISOBARIC, temperature, end().pressure(), temperature);
        return then(ProcessKind.ISOBARIC, temperature, () -> fluid().state(temperature, end().pressure()));
    }

    /**
     * {@return this chain and an isobaric step to a volume per mass}
     *
     * @param volume the specific volume at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricTo(SpecificVolume volume) {
        return then(ProcessKind.ISOBARIC, volume, () -> fluid().state(volume, end().pressure()));
    }

    /**
     * {@return this chain and an isobaric step to a volume}
     *
     * @param volume the volume of the mass at the end
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricTo(Volume volume) {
        return isobaricTo(perMass(volume));
    }

    /**
     * {@return this chain and an isobaric step to a multiple of the volume}
     *
     * @param ratio how many times, and which way
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricTo(VolumeRatio ratio) {
        return isobaricTo(scaled(ratio));
    }

    /**
     * {@return this chain and an isobaric step to a vapour fraction}
     *
     * @param vapourFraction mass of vapour per total mass at the end, 0 to 1
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricTo(Ratio vapourFraction) {
        return then(
                ProcessKind.ISOBARIC,
                "vapour fraction " + vapourFraction,
                () -> fluid().state(end().pressure(), vapourFraction));
    }

    /**
     * {@return this chain and an isobaric step that takes in a heat per mass}
     *
     * @param heat the heat per mass, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricAdding(SpecificEnergy heat) {
        return then(
                ProcessKind.ISOBARIC,
                new HeatAsked(heat),
                () -> fluid().state(end().pressure(), end().enthalpy().plus(heat)));
    }

    /**
     * {@return this chain and an isobaric step that takes in a heat}
     *
     * @param heat the heat, negative if it is given off
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     */
    public ProcessChain isobaricAdding(Energy heat) {
        return isobaricAdding(perMass(heat));
    }

    /**
     * {@return this chain and a polytropic step to a volume per mass}
     *
     * @param volume the specific volume at the end
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(SpecificVolume volume, double exponent) {
        Polytropes.requireExponent(exponent);
        return then(ProcessKind.POLYTROPIC, exponent, volume, () -> Polytropes.endAtVolume(end(), exponent, volume));
    }

    /**
     * {@return this chain and a polytropic step to a volume}
     *
     * @param volume the volume of the mass at the end
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(Volume volume, double exponent) {
        return polytropicTo(perMass(volume), exponent);
    }

    /**
     * {@return this chain and a polytropic step to a multiple of the volume}
     *
     * @param ratio how many times, and which way
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(VolumeRatio ratio, double exponent) {
        return polytropicTo(scaled(ratio), exponent);
    }

    /**
     * {@return this chain and a polytropic step to a pressure}
     *
     * @param pressure the absolute pressure at the end
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(Pressure pressure, double exponent) {
        Polytropes.requireExponent(exponent);
        return then(
                ProcessKind.POLYTROPIC, exponent, pressure, () -> Polytropes.endAtPressure(end(), exponent, pressure));
    }

    /**
     * {@return this chain and a polytropic step to a multiple of the pressure}
     *
     * @param ratio how many times, and which way
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(PressureRatio ratio, double exponent) {
        return polytropicTo(scaled(ratio), exponent);
    }

    /**
     * {@return this chain and a polytropic step to a temperature}
     *
     * @param temperature the temperature at the end
     * @param exponent n of {@code p vⁿ}, -1e6 to 1e6: 0 is isobaric, 1 is isothermal for an ideal gas, large is nearly isochoric
     * @throws ProcessException if the end cannot be reached within the range of the fluid
     *     or the exponent does not fit
     */
    public ProcessChain polytropicTo(Temperature temperature, double exponent) {
        Polytropes.requireExponent(exponent);
        return then(
                ProcessKind.POLYTROPIC,
                exponent,
                temperature,
                () -> Polytropes.endAtTemperature(end(), exponent, temperature));
    }

    /**
     * {@return this chain and a polytropic step to a known state, as between two measured points; the exponent follows}
     *
     * @param state the state at the end, from the same {@code Fluid} object
     * @throws ProcessException if the state belongs to another fluid, or has the same volume as the start, so that no exponent
     *     leads there
     */
    public ProcessChain polytropicTo(FluidState state) {
        closedMass.startingAt(state);
        return then(ProcessKind.POLYTROPIC, Polytropes.exponentBetween(end(), state), state, () -> state);
    }

    /** {@return the closed mass} */
    public ClosedMass closedMass() {
        return closedMass;
    }

    /** {@return the state at the start of the first step} */
    public FluidState start() {
        return start;
    }

    /** {@return the state at the end of the last step; the start if there is no step yet} */
    public FluidState end() {
        return steps.isEmpty() ? start : steps.get(steps.size() - 1).to();
    }

    /** {@return the steps in order} */
    public List<ProcessStep> steps() {
        return steps;
    }

    /** {@return the last step}
     *
     * @throws java.util.NoSuchElementException if there is no step yet
     */
    public ProcessStep lastStep() {
        return steps.stream().reduce((first, second) -> second).orElseThrow();
    }

    /** {@return the work of all steps} */
    public Energy netWork() {
        return Energy.joules(steps.stream().mapToDouble(s -> s.work().si()).sum());
    }

    /** {@return the heat of all steps} */
    public Energy netHeat() {
        return Energy.joules(steps.stream().mapToDouble(s -> s.heat().si()).sum());
    }

    /** {@return the heat taken in, without what is given off; see {@link ProcessStep#heatIn}} */
    public Energy heatIn() {
        return Energy.joules(steps.stream().mapToDouble(s -> s.heatIn().si()).sum());
    }

    /** {@return the heat given off, as a positive number} */
    public Energy heatOut() {
        return Energy.joules(steps.stream().mapToDouble(s -> s.heatOut().si()).sum());
    }

    /** {@return how much the internal energy grows from start to end} */
    public Energy energyChange() {
        return closedMass.mass().times(end().internalEnergy().minus(start.internalEnergy()));
    }

    /** {@return how much the entropy of the mass grows from start to end} */
    public Entropy entropyChange() {
        return closedMass.mass().times(end().entropy().minus(start.entropy()));
    }

    /** {@return how much the volume grows from start to end} */
    public Volume volumeChange() {
        return closedMass.mass().times(end().volume().minus(start.volume()));
    }

    /**
     * {@return the part of the net work that pushes the surroundings back: {@code p0 ΔV}; nothing over a cycle}
     *
     * @param surroundings the pressure of the surroundings behind the piston
     */
    public Energy surroundingsWork(Pressure surroundings) {
        return volumeChange().times(surroundings);
    }

    /**
     * {@return the net work that is left for use while the surroundings are pushed back: {@code W − p0 ΔV}}
     *
     * @param environment the environment behind the piston
     */
    public Energy usefulWork(ReferenceEnvironment environment) {
        return environment.workExergy(netWork(), volumeChange());
    }

    /**
     * {@return how much the exergy of the closed mass grows from start to end; negative where it has been used up}
     *
     * @param environment the environment that exergy counts from
     * @throws OutOfRangeException if the property model does not hold at the state of the environment
     */
    public Energy exergyChange(ReferenceEnvironment environment) {
        return closedMass.mass().times(environment.closedMassExergy(end()).minus(environment.closedMassExergy(start)));
    }

    /**
     * {@return the area under all steps in the pressure–volume diagram, by quadrature: of a cycle the enclosed area}
     *
     * @throws SolveException if a quadrature does not settle
     */
    public Energy pressureVolumeArea() {
        return Energy.joules(
                steps.stream().mapToDouble(s -> s.pressureVolumeArea().si()).sum());
    }

    /**
     * {@return the area under all steps in the temperature–entropy diagram, by quadrature: of a cycle the enclosed area}
     *
     * @throws SolveException if a quadrature does not settle
     */
    public Energy temperatureEntropyArea() {
        return Energy.joules(
                steps.stream().mapToDouble(s -> s.temperatureEntropyArea().si()).sum());
    }

    /**
     * {@return the distance from the end to the start: the largest of the differences of temperature, pressure and volume,
     * relative to their values at the start}
     */
    public Ratio relativeGap() {
        return Ratio.fraction(gapTo(start, end()));
    }

    private static double gapTo(FluidState start, FluidState end) {
        final double temperature = end.temperature().si() / start.temperature().si() - 1;
        final double pressure = end.pressure().si() / start.pressure().si() - 1;
        final double volume = end.volume().si() / start.volume().si() - 1;
        return Math.max(Math.abs(temperature), Math.max(Math.abs(pressure), Math.abs(volume)));
    }

    /** {@return whether the chain has steps and comes back to its start, to a relative gap of 1e-8} */
    public boolean closes() {
        return !steps.isEmpty() && gapTo(start, end()) <= CLOSED;
    }

    /**
     * {@return this chain as a cycle}
     *
     * @throws OpenChainException if it does not come back to its start; it tells by how much
     */
    public ProcessCycle closed() {
        if (!closes()) {
            throw new OpenChainException(
                    start,
                    end(),
                    gapTo(start, end()),
                    "add steps that lead back, with closedBy(...) for the last one, or take the chain as the one-way process"
                            + " that it is");
        }
        return ProcessCycle.of(this);
    }

    /**
     * {@return this chain with a last step straight back to the start, as a cycle}
     *
     * @param kind the kind of the last step; a polytropic one gets the exponent that fits
     * @throws OpenChainException if no step of this kind leads from the end to the start, since what it holds constant has
     *     another value there; it tells the gap
     * @throws ProcessException if the property model does not hold along the way, or a polytropic step would have no
     *     exponent
     */
    public ProcessCycle closedBy(ProcessKind kind) {
        final FluidState end = end();
        if (!(heldGap(kind, end, start) <= CLOSED)) {
            throw new OpenChainException(
                    start,
                    end,
                    gapTo(start, end),
                    "the " + kind + " path through the end does not meet the start; let the step before it end where it"
                            + " does");
        }
        final double exponent = kind == ProcessKind.POLYTROPIC ? Polytropes.exponentBetween(end, start) : Double.NaN;
        return ProcessCycle.of(then(kind, exponent, "the start", () -> start));
    }

    /** {@return how far two states are from having the same value of what a kind of step holds constant, relative} */
    private static double heldGap(ProcessKind kind, FluidState end, FluidState start) {
        return switch (kind) {
            case ISOTHERMAL ->
                Math.abs(end.temperature().si() / start.temperature().si() - 1);
            case ISOBARIC -> Math.abs(end.pressure().si() / start.pressure().si() - 1);
            case ISOCHORIC -> Math.abs(end.volume().si() / start.volume().si() - 1);
            case ISENTROPIC ->
                Math.abs(end.entropy().si() - start.entropy().si())
                        / start.isochoricHeatCapacity().si();
            case POLYTROPIC -> 0;
        };
    }

    /** {@return the states between the steps, numbered from 1} */
    public Table stateTable() {
        return ChainTables.states(this);
    }

    /** {@return the steps with their work, heat and entropy change, and their sum} */
    public Table stepTable() {
        return ChainTables.steps(this);
    }

    /** {@return states and steps in aligned columns with units} */
    @Override
    public String toString() {
        return closedMass + "\n\n" + stateTable() + "\n" + stepTable();
    }
}
