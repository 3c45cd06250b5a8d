package lostwork.fluid;

import java.util.Objects;
import java.util.Optional;
import lostwork.exergy.ThermodynamicState;
import lostwork.quantity.Density;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Speed;
import lostwork.quantity.Temperature;

/**
 * An equilibrium state of a fluid: complete, immutable, thread-safe.
 *
 * <p>Two states are equal when they belong to the same fluid and all their properties are the same numbers.
 */
public final class FluidState implements ThermodynamicState {
    private final Fluid fluid;
    /** Never written after construction. */
    private final StatePoint point;

    /** Takes over a point that nobody else keeps. */
    FluidState(Fluid fluid, StatePoint point) {
        point.dropWorkAreas();
        this.fluid = fluid;
        this.point = point;
    }

    /** {@return the fluid} */
    public Fluid fluid() {
        return fluid;
    }

    @Override
    public Temperature temperature() {
        return Temperature.kelvin(point.temperature);
    }

    @Override
    public Pressure pressure() {
        return Pressure.pascal(point.pressure);
    }

    @Override
    public SpecificVolume volume() {
        return SpecificVolume.cubicMetresPerKilogram(point.volume);
    }

    /** {@return the density 1/v} */
    public Density density() {
        return Density.kilogramsPerCubicMetre(1 / point.volume);
    }

    @Override
    public SpecificEnergy internalEnergy() {
        return SpecificEnergy.joulesPerKilogram(point.internalEnergy());
    }

    @Override
    public SpecificEnergy enthalpy() {
        return SpecificEnergy.joulesPerKilogram(point.enthalpy);
    }

    @Override
    public SpecificEntropy entropy() {
        return SpecificEntropy.joulesPerKilogramKelvin(point.entropy);
    }

    /**
     * {@return the heat capacity at constant pressure cp = (∂h/∂T)<sub>p</sub>}
     *
     * @throws UndefinedPropertyException if liquid and vapour coexist: there cp is infinite, since heat at constant pressure
     *     does not change the temperature
     */
    public SpecificHeatCapacity isobaricHeatCapacity() {
        if (point.phase == Phase.TWO_PHASE) {
            throw new UndefinedPropertyException(
                    "finite heat capacity at constant pressure",
                    fluid.name(),
                    "liquid and vapour coexist at " + temperature() + " and " + pressure(),
                    "take fluid().saturation(temperature()).liquid() or vapour(), or isochoricHeatCapacity()");
        }
        return SpecificHeatCapacity.joulesPerKilogramKelvin(point.heatCapacity);
    }

    /**
     * {@return the heat capacity at constant volume cv = (∂u/∂T)<sub>v</sub>}
     *
     * <p>Where liquid and vapour coexist it counts the evaporation on the way, and so is finite but larger than in one
     * phase.
     */
    public SpecificHeatCapacity isochoricHeatCapacity() {
        return SpecificHeatCapacity.joulesPerKilogramKelvin(point.isochoricHeatCapacity());
    }

    /**
     * {@return the speed of sound, w² = (∂p/∂ρ)<sub>s</sub>}
     *
     * <p>Where liquid and vapour coexist it is the one of a mixture that stays in equilibrium while the wave passes, a lower
     * limit to what is measured.
     *
     * @throws UndefinedPropertyException if the model is incompressible, so that the speed would be infinite
     */
    public Speed speedOfSound() {
        if (Double.isInfinite(point.speedOfSound())) {
            throw new UndefinedPropertyException(
                    "finite speed of sound",
                    fluid.name(),
                    "its model is incompressible here",
                    "take a model with a compressible liquid");
        }
        return Speed.metresPerSecond(point.speedOfSound());
    }

    /**
     * {@return the enthalpy counted from the elements in their standard states at 298.15 K and 1 bar}
     *
     * <p>Where streams of different models meet, as water sprayed into flue gas, their own zero points differ; this one is
     * common to all.
     *
     * @throws UndefinedPropertyException if the model has no formation data
     */
    public SpecificEnergy enthalpyFromElements() {
        return SpecificEnergy.joulesPerKilogram(point.enthalpy
                + requireFormation("enthalpy of formation", fluid.model().enthalpyFromElements()));
    }

    /**
     * {@return the absolute entropy, zero in the perfect crystal at 0 K (third law)}
     *
     * @throws UndefinedPropertyException if the model has no such data
     */
    public SpecificEntropy absoluteEntropy() {
        return SpecificEntropy.joulesPerKilogramKelvin(point.entropy
                + requireFormation("absolute entropy", fluid.model().entropyFromAbsoluteZero()));
    }

    private double requireFormation(String property, double offset) {
        if (Double.isNaN(offset)) {
            throw new UndefinedPropertyException(
                    property,
                    fluid.name(),
                    "its model has no formation data",
                    "take a fluid with formation data where it meets another one or reacts");
        }
        return offset;
    }

    /** {@return the phase region} */
    public Phase phase() {
        return point.phase;
    }

    /** {@return the mass of vapour per total mass; empty away from saturation, where it has no meaning} */
    public Optional<Ratio> vapourFraction() {
        return Double.isNaN(point.vapourFraction)
                ? Optional.empty()
                : Optional.of(Ratio.fraction(point.vapourFraction));
    }

    /**
     * Copies all properties and derivatives, in coherent SI units, into a point of the caller.
     *
     * @param out the point to fill
     */
    public void copyTo(StatePoint out) {
        out.set(point);
    }

    /**
     * {@return what this state has more than another of the same fluid}
     *
     * @param other the state that the difference is counted from
     * @throws IllegalArgumentException if the other state belongs to another fluid, whose zero points differ
     */
    public StateDifference minus(FluidState other) {
        if (!fluid.equals(other.fluid)) {
            throw new IllegalArgumentException("a state of " + fluid.name() + " less one of another fluid, "
                    + other.fluid.name() + ", means nothing: their energies count from different zero points; take both"
                    + " from the same Fluid object");
        }
        return new StateDifference(this, other);
    }

    @Override
    public FluidState broughtTo(Temperature temperature, Pressure pressure) {
        return fluid.state(temperature, pressure);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof FluidState that
                && fluid.equals(that.fluid)
                && point.phase == that.point.phase
                && Double.compare(point.temperature, that.point.temperature) == 0
                && Double.compare(point.pressure, that.point.pressure) == 0
                && Double.compare(point.volume, that.point.volume) == 0
                && Double.compare(point.enthalpy, that.point.enthalpy) == 0
                && Double.compare(point.entropy, that.point.entropy) == 0
                && Double.compare(point.vapourFraction, that.point.vapourFraction) == 0;
    }

    @Override
    public int hashCode() {
        return Objects.hash(fluid, point.temperature, point.pressure, point.enthalpy);
    }

    /** {@return fluid and phase, then the properties one a line with their units} */
    @Override
    public String toString() {
        final PropertyTable table = PropertyTable.titled(fluid.name() + ", " + point.phase)
                .row("T", temperature())
                .row("p", pressure())
                .row("v", volume())
                .row("u", internalEnergy())
                .row("h", enthalpy())
                .row("s", entropy());
        if (point.phase == Phase.TWO_PHASE) {
            table.note("cp", "infinite");
        } else {
            table.row("cp", isobaricHeatCapacity());
        }
        table.row("cv", isochoricHeatCapacity());
        if (Double.isInfinite(point.speedOfSound())) {
            table.note("w", "infinite");
        } else {
            table.row("w", speedOfSound());
        }
        vapourFraction().ifPresent(x -> table.row("x", x));
        return table.print();
    }
}
