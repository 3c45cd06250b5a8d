package lostwork.process;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FluidState;
import lostwork.quantity.Energy;
import lostwork.quantity.Entropy;
import lostwork.quantity.Mass;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;
import lostwork.quantity.Volume;

/**
 * One internally reversible change of a closed mass: where it starts and ends, its work, its heat.
 *
 * <p>Heat is positive into the mass, work is positive out of it, {@code Q = ΔU + W}.
 *
 * <h2>Formulas, per mass</h2>
 * <ul>
 *   <li>isothermal: {@code w = ∫ p dv} by adaptive quadrature, {@code psat Δv} where liquid and vapour coexist;
 *   <li>isentropic: {@code q = 0}, {@code w = u1 − u2};
 *   <li>isochoric: {@code w = 0}; isobaric: {@code w = p (v2 − v1)};
 *   <li>polytropic: {@code w = (p2 v2 − p1 v1)/(1 − n)}, {@code p1 v1 ln(v2/v1)} at {@code n = 1}.
 * </ul>
 * In all but the isentropic one the heat follows from the energy balance. {@link #pressureVolumeArea} and
 * {@link #temperatureEntropyArea} measure the same work and heat once more as areas in the state diagrams, from other
 * properties; their agreement is evidence for the figures and for the property model.
 *
 * <p>Immutable and thread-safe.
 */
public final class ProcessStep {
    private final ProcessKind kind;
    private final double exponent;
    private final Mass mass;
    private final FluidState from;
    private final FluidState to;
    private final double specificWork;
    private final double specificHeat;

    private ProcessStep(
            ProcessKind kind,
            double exponent,
            Mass mass,
            FluidState from,
            FluidState to,
            double specificWork,
            double specificHeat) {
        this.kind = kind;
        this.exponent = exponent;
        this.mass = mass;
        this.from = from;
        this.to = to;
        this.specificWork = specificWork;
        this.specificHeat = specificHeat;
    }

    /** {@return a step between two states that are known to lie on one path of the kind} */
    static ProcessStep between(ProcessKind kind, double exponent, Mass mass, FluidState from, FluidState to) {
        final double energy = to.internalEnergy().si() - from.internalEnergy().si();
        if (kind == ProcessKind.ISENTROPIC) {
            return new ProcessStep(kind, exponent, mass, from, to, -energy, 0);
        }
        final double work = work(kind, exponent, from, to);
        return new ProcessStep(kind, exponent, mass, from, to, work, energy + work);
    }

    private static double work(ProcessKind kind, double exponent, FluidState from, FluidState to) {
        final double startPressure = from.pressure().si();
        final double startVolume = from.volume().si();
        return switch (kind) {
            case ISOCHORIC -> 0;
            case ISOBARIC -> startPressure * (to.volume().si() - startVolume);
            case POLYTROPIC ->
                polytropicWork(startPressure * startVolume, Math.log(to.volume().si() / startVolume), exponent);
            default -> pressureVolumeArea(PathPieces.of(kind, exponent, from, to));
        };
    }

    /** ∫ p dv = p1 v1 ∫ exp((1 − n) λ) dλ from 0 to ln(v2/v1); smooth through n = 1. */
    private static double polytropicWork(double startProduct, double logVolumeRatio, double exponent) {
        final double growth = (1 - exponent) * logVolumeRatio;
        return startProduct * logVolumeRatio * (growth == 0 ? 1 : Math.expm1(growth) / growth);
    }

    private static double pressureVolumeArea(List<PathPiece> pieces) {
        double area = 0;
        for (PathPiece piece : pieces) {
            area += piece.pressureVolumeArea();
        }
        return area;
    }

    private List<PathPiece> pieces() {
        return PathPieces.of(kind, exponent, from, to);
    }

    /** {@return what is held constant} */
    public ProcessKind kind() {
        return kind;
    }

    /** {@return n of {@code p vⁿ}; empty for a step that is not polytropic} */
    public OptionalDouble exponent() {
        return kind == ProcessKind.POLYTROPIC ? OptionalDouble.of(exponent) : OptionalDouble.empty();
    }

    /** {@return the kind, with the exponent where there is one} */
    String label() {
        return kind == ProcessKind.POLYTROPIC ? String.format(Locale.ROOT, "%s, n = %.4g", kind, exponent) : "" + kind;
    }

    /** {@return the state at the start} */
    public FluidState from() {
        return from;
    }

    /** {@return the state at the end} */
    public FluidState to() {
        return to;
    }

    /** {@return the work that the mass does on the piston; negative where it is compressed} */
    public Energy work() {
        return mass.times(specificWork());
    }

    /** {@return the heat that the mass takes in; negative where it gives heat off} */
    public Energy heat() {
        return mass.times(specificHeat());
    }

    /**
     * {@return the heat taken in on the way, without what is given off on the way}
     *
     * <p>The heat of the step where that is positive, and zero otherwise; but a polytropic path can turn from taking heat in to
     * giving it off, and then the parts are counted on their own.
     */
    public Energy heatIn() {
        return mass.times(SpecificEnergy.joulesPerKilogram(positiveHeat()));
    }

    /** {@return the heat given off on the way, as a positive number; {@link #heatIn} less {@link #heat}} */
    public Energy heatOut() {
        return mass.times(SpecificEnergy.joulesPerKilogram(positiveHeat() - specificHeat));
    }

    private double positiveHeat() {
        if (kind != ProcessKind.POLYTROPIC) {
            return Math.max(0, specificHeat);
        }
        double sum = 0;
        FluidState first = from;
        for (FluidState last : HeatTurns.along(from, to, exponent)) {
            sum += Math.max(0, between(kind, exponent, mass, first, last).specificHeat);
            first = last;
        }
        return sum;
    }

    /** {@return the work per mass} */
    public SpecificEnergy specificWork() {
        return SpecificEnergy.joulesPerKilogram(specificWork);
    }

    /** {@return the heat per mass} */
    public SpecificEnergy specificHeat() {
        return SpecificEnergy.joulesPerKilogram(specificHeat);
    }

    /** {@return how much the internal energy grows} */
    public Energy energyChange() {
        return mass.times(to.internalEnergy().minus(from.internalEnergy()));
    }

    /** {@return how much the entropy of the mass grows} */
    public Entropy entropyChange() {
        return mass.times(to.entropy().minus(from.entropy()));
    }

    /** {@return how much the volume grows} */
    public Volume volumeChange() {
        return mass.times(to.volume().minus(from.volume()));
    }

    /**
     * {@return the part of the work that pushes the surroundings back: {@code p0 ΔV}}
     *
     * @param surroundings the pressure of the surroundings behind the piston
     */
    public Energy surroundingsWork(Pressure surroundings) {
        return volumeChange().times(surroundings);
    }

    /**
     * {@return the work that is left for use while the surroundings are pushed back: {@code W − p0 ΔV}}
     *
     * @param environment the environment behind the piston
     */
    public Energy usefulWork(ReferenceEnvironment environment) {
        return environment.workExergy(work(), volumeChange());
    }

    /**
     * {@return how much the exergy of the closed mass grows}
     *
     * @param environment the environment that exergy counts from
     * @throws lostwork.quantity.OutOfRangeException if the property model does not hold at the state of the environment
     */
    public Energy exergyChange(ReferenceEnvironment environment) {
        return mass.times(environment.closedMassExergy(to).minus(environment.closedMassExergy(from)));
    }

    /**
     * {@return the entropy generated when the heat of this step is exchanged with a reservoir: {@code ΔS − Q/T}}
     *
     * <p>Zero if the step is isothermal at the temperature of the reservoir, or adiabatic. The work lost by it is
     * {@link lostwork.exergy.GouyStodola#lostWork(Entropy, ReferenceEnvironment)}.
     *
     * @param reservoir the temperature of the reservoir
     * @throws ProcessException if heat would flow from the colder to the hotter side
     */
    public Entropy entropyGenerationWith(Temperature reservoir) {
        requireDownhill(reservoir);
        return entropyChange().minus(Entropy.ofHeat(heat(), reservoir));
    }

    /** Refuses a reservoir that the heat of this step would have to flow from, or to, against the difference of temperature. */
    void requireDownhill(Temperature reservoir) {
        final double kelvin = reservoir.si();
        final double limit =
                specificHeat > 0 ? hottestKelvin() - kelvin : specificHeat < 0 ? kelvin - coldestKelvin() : 0;
        if (!(limit <= 1e-9 * kelvin)) {
            throw new ProcessException(
                    ProcessException.Reason.HEAT_UPHILL,
                    "the heat of " + this + " cannot " + (specificHeat > 0 ? "come from" : "go to") + " a reservoir at "
                            + reservoir + ", since the mass reaches "
                            + Temperature.kelvin(specificHeat > 0 ? hottestKelvin() : coldestKelvin())
                            + "; take a " + (specificHeat > 0 ? "hotter" : "colder")
                            + " reservoir, or split the step between several");
        }
    }

    /** {@return the highest temperature on the path in K} */
    double hottestKelvin() {
        double hottest = Math.max(from.temperature().si(), to.temperature().si());
        for (FluidState state : innerStates()) {
            hottest = Math.max(hottest, state.temperature().si());
        }
        return hottest;
    }

    /** {@return the lowest temperature on the path in K} */
    double coldestKelvin() {
        double coldest = Math.min(from.temperature().si(), to.temperature().si());
        for (FluidState state : innerStates()) {
            coldest = Math.min(coldest, state.temperature().si());
        }
        return coldest;
    }

    /** Only along a polytropic path of a real fluid can the temperature turn round. */
    private List<FluidState> innerStates() {
        return kind == ProcessKind.POLYTROPIC && from.fluid().model().enthalpyDependsOnPressure()
                ? path(65)
                : List.of();
    }

    /**
     * {@return states along the path, in order, for a diagram: start and end included, and every point where the path
     * enters or leaves the two-phase region, so that drawn lines have their corners}
     *
     * @param points how many states at least, 2 to 100,000
     * @throws IllegalArgumentException if the number is outside 2 to 100,000
     * @throws lostwork.quantity.OutOfRangeException if the property model does not hold on the way, though at both ends
     */
    public List<FluidState> path(int points) {
        if (points < 2 || points > 100_000) {
            throw new IllegalArgumentException("points = " + points + " is outside 2 .. 100000");
        }
        final List<PathPiece> pieces = pieces();
        final int parts = Math.max(1, (points - 1 + pieces.size() - 1) / pieces.size());
        final List<FluidState> states = new ArrayList<>(pieces.size() * parts + 1);
        states.add(from);
        for (PathPiece piece : pieces) {
            for (int i = 1; i < parts; i++) {
                states.add(piece.at(piece.begin() + (piece.end() - piece.begin()) * i / parts));
            }
            states.add(piece.last);
        }
        return List.copyOf(states);
    }

    /**
     * {@return the area under the path in the pressure–volume diagram, {@code ∫ p dV}, by quadrature along the path}
     *
     * @throws lostwork.solve.ConvergenceException if the quadrature does not settle
     * @throws lostwork.quantity.OutOfRangeException if the property model does not hold on the way, though at both ends
     */
    public Energy pressureVolumeArea() {
        return mass.times(SpecificEnergy.joulesPerKilogram(pressureVolumeArea(pieces())));
    }

    /**
     * {@return the area under the path in the temperature–entropy diagram, {@code ∫ T dS}, by quadrature along the path}
     *
     * @throws lostwork.solve.ConvergenceException if the quadrature does not settle
     * @throws lostwork.quantity.OutOfRangeException if the property model does not hold on the way, though at both ends
     */
    public Energy temperatureEntropyArea() {
        double area = 0;
        for (PathPiece piece : pieces()) {
            area += piece.temperatureEntropyArea();
        }
        return mass.times(SpecificEnergy.joulesPerKilogram(area));
    }

    /** {@return the kind and both ends, such as {@code isobaric step from 20 °C, 1 bar to 80 °C, 1 bar}} */
    @Override
    public String toString() {
        return kind + " step from " + from.temperature() + ", " + from.pressure() + " to " + to.temperature() + ", "
                + to.pressure();
    }
}
