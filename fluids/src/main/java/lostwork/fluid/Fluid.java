package lostwork.fluid;

import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.Temperature;

/**
 * The typed face of every fluid: states from any pair of properties, saturation, range and provenance.
 *
 * <p>Because each quantity has a class of its own, the overloads of {@code state} pick the right flash. The methods are
 * final, so that a typed call costs what the primitive one costs. Immutable and thread-safe.
 */
public abstract class Fluid {
    private final FluidModel model;

    /**
     * Creates the face of a model.
     *
     * @param model the property model
     */
    protected Fluid(FluidModel model) {
        this.model = model;
    }

    /**
     * {@return the typed face of a property model of one's own}
     *
     * @param model the property model
     */
    public static Fluid of(FluidModel model) {
        return new ModelledFluid(model);
    }

    /** {@return the primitive interface behind this fluid} */
    public final FluidModel model() {
        return model;
    }

    /**
     * {@return the stable state at a temperature and a pressure}
     *
     * @param temperature the temperature
     * @param pressure the absolute pressure
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    public final FluidState state(Temperature temperature, Pressure pressure) {
        final StatePoint point = new StatePoint();
        model.atTemperaturePressure(temperature.si(), pressure.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a pressure and an enthalpy}
     *
     * @param pressure the absolute pressure
     * @param enthalpy the specific enthalpy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    public final FluidState state(Pressure pressure, SpecificEnergy enthalpy) {
        final StatePoint point = new StatePoint();
        model.atPressureEnthalpy(pressure.si(), enthalpy.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a pressure and an entropy}
     *
     * @param pressure the absolute pressure
     * @param entropy the specific entropy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    public final FluidState state(Pressure pressure, SpecificEntropy entropy) {
        final StatePoint point = new StatePoint();
        model.atPressureEntropy(pressure.si(), entropy.si(), point);
        return new FluidState(this, point);
    }

    /** A fluid that is nothing but its model. */
    private static final class ModelledFluid extends Fluid {
        ModelledFluid(FluidModel model) {
            super(model);
        }
    }
}
