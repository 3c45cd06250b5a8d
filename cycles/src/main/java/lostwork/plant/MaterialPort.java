package lostwork.plant;

import java.util.List;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * A port that a stream of matter passes.
 *
 * <p>Its variables are those of the stream: an outlet and the inlet that it is connected to share them. Pressure,
 * enthalpy and mass flow are always there; the others come into being when somebody gives them or an equation uses them.
 */
public abstract class MaterialPort extends Port {
    private final Variable<Pressure> pressure;
    private final Variable<SpecificEnergy> enthalpy;
    private final Variable<MassFlow> flow;
    private final Variable<Temperature> temperature;
    private final Variable<SpecificEntropy> entropy;
    private final Variable<SpecificVolume> volume;
    private final Variable<Ratio> vapourFraction;
    private final Variable<TemperatureSpan> superheat;
    private final Variable<TemperatureSpan> subcooling;

    MaterialPort(String component, String name) {
        super(component, name);
        pressure = new Variable<>(component, name + " pressure", Pressure.KIND);
        enthalpy = new Variable<>(component, name + " enthalpy", SpecificEnergy.KIND);
        flow = new Variable<>(component, name + " flow", MassFlow.KIND, 0, Double.MAX_VALUE);
        temperature = new Variable<>(component, name + " temperature", Temperature.KIND);
        entropy = new Variable<>(component, name + " entropy", SpecificEntropy.KIND);
        volume = new Variable<>(component, name + " specific volume", SpecificVolume.KIND);
        vapourFraction = new Variable<>(component, name + " vapour fraction", Ratio.KIND, 0, 1);
        superheat = new Variable<>(component, name + " superheat", TemperatureSpan.KIND, 0, Double.MAX_VALUE);
        subcooling = new Variable<>(component, name + " subcooling", TemperatureSpan.KIND, 0, Double.MAX_VALUE);
    }

    /** {@return the absolute pressure} */
    public final Variable<Pressure> pressure() {
        return pressure;
    }

    /** {@return the specific enthalpy} */
    public final Variable<SpecificEnergy> enthalpy() {
        return enthalpy;
    }

    /** {@return the mass flow} */
    public final Variable<MassFlow> flow() {
        return flow;
    }

    /** {@return the temperature} */
    public final Variable<Temperature> temperature() {
        return temperature;
    }

    /** {@return the specific entropy} */
    public final Variable<SpecificEntropy> entropy() {
        return entropy;
    }

    /** {@return the specific volume} */
    public final Variable<SpecificVolume> volume() {
        return volume;
    }

    /** {@return the mass of vapour per total mass; for a fluid with a saturation line} */
    public final Variable<Ratio> vapourFraction() {
        return vapourFraction;
    }

    /** {@return how far the temperature lies above saturation; for a fluid with a saturation line} */
    public final Variable<TemperatureSpan> superheat() {
        return superheat;
    }

    /** {@return how far the temperature lies below saturation; for a fluid with a saturation line} */
    public final Variable<TemperatureSpan> subcooling() {
        return subcooling;
    }

    /**
     * {@return the enthalpy that the fluid of this port has at a pressure and an entropy}
     *
     * @param pressure the pressure
     * @param entropy the specific entropy
     */
    public final Expression enthalpyAt(Expression pressure, Expression entropy) {
        return new Expression.Property(
                FluidFunction.ENTHALPY_OF_PRESSURE_AND_ENTROPY, this, List.of(pressure, entropy));
    }

    /**
     * {@return the enthalpy that the fluid of this port has at a pressure and a temperature}
     *
     * @param pressure the pressure
     * @param temperature the temperature
     */
    public final Expression enthalpyAtTemperature(Expression pressure, Expression temperature) {
        return new Expression.Property(
                FluidFunction.ENTHALPY_OF_PRESSURE_AND_TEMPERATURE, this, List.of(pressure, temperature));
    }

    /**
     * {@return the enthalpy of a mixture of saturated liquid and saturated vapour of the fluid of this port}
     *
     * @param pressure the pressure
     * @param vapourFraction the mass of vapour per total mass
     */
    public final Expression saturatedEnthalpy(Expression pressure, Expression vapourFraction) {
        return new Expression.Property(
                FluidFunction.ENTHALPY_OF_PRESSURE_AND_VAPOUR_FRACTION, this, List.of(pressure, vapourFraction));
    }

    /**
     * {@return the temperature that the fluid of this port has at a pressure and an enthalpy}
     *
     * @param pressure the pressure
     * @param enthalpy the specific enthalpy
     */
    public final Expression temperatureAt(Expression pressure, Expression enthalpy) {
        return new Expression.Property(
                FluidFunction.TEMPERATURE_OF_PRESSURE_AND_ENTHALPY, this, List.of(pressure, enthalpy));
    }

    /**
     * {@return the saturation temperature of the fluid of this port}
     *
     * @param pressure the pressure
     */
    public final Expression saturationTemperature(Expression pressure) {
        return new Expression.Property(FluidFunction.SATURATION_TEMPERATURE_OF_PRESSURE, this, List.of(pressure));
    }
}
