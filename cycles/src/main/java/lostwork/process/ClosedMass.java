package lostwork.process;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.quantity.Mass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;

/**
 * A mass of a fluid enclosed by a piston, a membrane or a rigid wall: nothing flows in or out.
 *
 * <pre>{@code
 * var air = ClosedMass.of(DryAir.standard(), kilograms(1));
 * var otto = air.startingAt(kelvin(290), kilopascal(100))
 *         .isentropicTo(compressionRatio(8))
 *         .isochoricAdding(kilojoulesPerKilogram(800))
 *         .isentropicTo(expansionRatio(8))
 *         .closedBy(ProcessKind.ISOCHORIC);
 * otto.thermalEfficiency();       // 52.3 %
 * }</pre>
 *
 * <p>Immutable and thread-safe.
 */
public final class ClosedMass {
    private final Fluid fluid;
    private final Mass mass;

    private ClosedMass(Fluid fluid, Mass mass) {
        this.fluid = fluid;
        this.mass = mass;
    }

    /**
     * {@return a closed mass}
     *
     * @param fluid the fluid
     * @param mass its mass, above 0
     * @throws OutOfRangeException if the mass is not above 0
     */
    public static ClosedMass of(Fluid fluid, Mass mass) {
        if (!(mass.si() > 0)) {
            throw new OutOfRangeException(
                    "closed mass",
                    mass.si(),
                    Double.MIN_VALUE,
                    Double.MAX_VALUE,
                    "kg",
                    "a closed system holds matter",
                    "");
        }
        return new ClosedMass(fluid, mass);
    }

    /** {@return the fluid} */
    public Fluid fluid() {
        return fluid;
    }

    /** {@return the mass} */
    public Mass mass() {
        return mass;
    }

    /**
     * {@return a chain without steps that starts at a state}
     *
     * @param state a state of this fluid, from the same {@code Fluid} object
     * @throws ProcessException if the state belongs to another fluid
     */
    public ProcessChain startingAt(FluidState state) {
        if (!state.fluid().equals(fluid)) {
            throw new ProcessException(
                    ProcessException.Reason.OTHER_FLUID,
                    "the closed mass holds " + fluid.name() + ", and the state belongs to another fluid object, "
                            + state.fluid().name() + "; make the state with closedMass.fluid().state(...)");
        }
        return ProcessChain.startingAt(this, state);
    }

    /**
     * {@return a chain without steps that starts at a temperature and a pressure}
     *
     * @param temperature the temperature
     * @param pressure the absolute pressure
     * @throws OutOfRangeException if the property model does not hold there
     */
    public ProcessChain startingAt(Temperature temperature, Pressure pressure) {
        return startingAt(fluid.state(temperature, pressure));
    }

    /** {@return mass and fluid, such as {@code 1 kg air}} */
    @Override
    public String toString() {
        return mass + " " + fluid.name();
    }
}
