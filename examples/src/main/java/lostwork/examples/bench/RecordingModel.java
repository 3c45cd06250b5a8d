package lostwork.examples.bench;

import java.util.ArrayList;
import java.util.List;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import org.jspecify.annotations.Nullable;

/** A fluid model that notes each evaluation that is asked of it, and hands it on. Not for several threads. */
final class RecordingModel implements FluidModel {
    /** What is asked of a model. */
    enum Kind {
        EVALUATE_LIQUID,
        EVALUATE_VAPOUR,
        TEMPERATURE_PRESSURE,
        PRESSURE_ENTHALPY,
        PRESSURE_ENTROPY,
        PRESSURE_VOLUME,
        PRESSURE_VAPOUR_FRACTION,
        TEMPERATURE_VAPOUR_FRACTION,
        TEMPERATURE_ENTROPY,
        TEMPERATURE_VOLUME,
        ENTHALPY_ENTROPY,
        INTERNAL_ENERGY_VOLUME,
        ENTROPY_VOLUME,
        SATURATED_LIQUID_AT_TEMPERATURE,
        SATURATED_VAPOUR_AT_TEMPERATURE,
        SATURATED_LIQUID_AT_PRESSURE,
        SATURATED_VAPOUR_AT_PRESSURE,
        SATURATION_PRESSURE,
        SATURATION_TEMPERATURE,
        SATURATION_SLOPE
    }

    /** One evaluation with its two arguments; the second is 0 where there is one only. */
    record Call(Kind kind, double first, double second) {
        /** Does it again. */
        double replay(FluidModel model, SaturationModel saturation, StatePoint out) {
            switch (kind) {
                case EVALUATE_LIQUID -> model.evaluate(first, second, PhaseSide.LIQUID, out);
                case EVALUATE_VAPOUR -> model.evaluate(first, second, PhaseSide.VAPOUR, out);
                case TEMPERATURE_PRESSURE -> model.atTemperaturePressure(first, second, out);
                case PRESSURE_ENTHALPY -> model.atPressureEnthalpy(first, second, out);
                case PRESSURE_ENTROPY -> model.atPressureEntropy(first, second, out);
                case PRESSURE_VOLUME -> model.atPressureVolume(first, second, out);
                case PRESSURE_VAPOUR_FRACTION -> model.atPressureVapourFraction(first, second, out);
                case TEMPERATURE_VAPOUR_FRACTION -> model.atTemperatureVapourFraction(first, second, out);
                case TEMPERATURE_ENTROPY -> model.atTemperatureEntropy(first, second, out);
                case TEMPERATURE_VOLUME -> model.atTemperatureVolume(first, second, out);
                case ENTHALPY_ENTROPY -> model.atEnthalpyEntropy(first, second, out);
                case INTERNAL_ENERGY_VOLUME -> model.atInternalEnergyVolume(first, second, out);
                case ENTROPY_VOLUME -> model.atEntropyVolume(first, second, out);
                case SATURATED_LIQUID_AT_TEMPERATURE -> model.saturatedAtTemperature(first, PhaseSide.LIQUID, out);
                case SATURATED_VAPOUR_AT_TEMPERATURE -> model.saturatedAtTemperature(first, PhaseSide.VAPOUR, out);
                case SATURATED_LIQUID_AT_PRESSURE -> model.saturatedAtPressure(first, PhaseSide.LIQUID, out);
                case SATURATED_VAPOUR_AT_PRESSURE -> model.saturatedAtPressure(first, PhaseSide.VAPOUR, out);
                case SATURATION_PRESSURE -> {
                    return saturation.pressure(first);
                }
                case SATURATION_TEMPERATURE -> {
                    return saturation.temperature(first);
                }
                case SATURATION_SLOPE -> {
                    return saturation.pressureByTemperature(first);
                }
            }
            return out.enthalpy;
        }
    }

    private final FluidModel model;
    private final SaturationModel recordingSaturation;
    private final List<Call> calls = new ArrayList<>();

    RecordingModel(FluidModel model) {
        this.model = model;
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            throw new IllegalArgumentException(model.name() + " has no saturation");
        }
        recordingSaturation = new RecordingSaturation(saturation);
    }

    List<Call> calls() {
        return List.copyOf(calls);
    }

    void forget() {
        calls.clear();
    }

    private void note(Kind kind, double first, double second) {
        calls.add(new Call(kind, first, second));
    }

    @Override
    public String name() {
        return model.name();
    }

    @Override
    public double molarMass() {
        return model.molarMass();
    }

    @Override
    public FluidRange range() {
        return model.range();
    }

    @Override
    public Provenance provenance() {
        return model.provenance();
    }

    @Override
    public @Nullable SaturationModel saturation() {
        return recordingSaturation;
    }

    @Override
    public boolean enthalpyDependsOnPressure() {
        return model.enthalpyDependsOnPressure();
    }

    @Override
    public double enthalpyFromElements() {
        return model.enthalpyFromElements();
    }

    @Override
    public double entropyFromAbsoluteZero() {
        return model.entropyFromAbsoluteZero();
    }

    @Override
    public double lowestTemperatureAt(double pressure) {
        return model.lowestTemperatureAt(pressure);
    }

    @Override
    public double highestTemperatureAt(double pressure) {
        return model.highestTemperatureAt(pressure);
    }

    @Override
    public double lowestPressureAt(double temperature) {
        return model.lowestPressureAt(temperature);
    }

    @Override
    public double highestPressureAt(double temperature) {
        return model.highestPressureAt(temperature);
    }

    @Override
    public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
        note(side == PhaseSide.LIQUID ? Kind.EVALUATE_LIQUID : Kind.EVALUATE_VAPOUR, temperature, pressure);
        model.evaluate(temperature, pressure, side, out);
    }

    @Override
    public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
        note(Kind.TEMPERATURE_PRESSURE, temperature, pressure);
        model.atTemperaturePressure(temperature, pressure, out);
    }

    @Override
    public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
        note(Kind.PRESSURE_ENTHALPY, pressure, enthalpy);
        model.atPressureEnthalpy(pressure, enthalpy, out);
    }

    @Override
    public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        note(Kind.PRESSURE_ENTROPY, pressure, entropy);
        model.atPressureEntropy(pressure, entropy, out);
    }

    @Override
    public void atPressureVolume(double pressure, double volume, StatePoint out) {
        note(Kind.PRESSURE_VOLUME, pressure, volume);
        model.atPressureVolume(pressure, volume, out);
    }

    @Override
    public void atPressureVapourFraction(double pressure, double vapourFraction, StatePoint out) {
        note(Kind.PRESSURE_VAPOUR_FRACTION, pressure, vapourFraction);
        model.atPressureVapourFraction(pressure, vapourFraction, out);
    }

    @Override
    public void atTemperatureVapourFraction(double temperature, double vapourFraction, StatePoint out) {
        note(Kind.TEMPERATURE_VAPOUR_FRACTION, temperature, vapourFraction);
        model.atTemperatureVapourFraction(temperature, vapourFraction, out);
    }

    @Override
    public void atTemperatureEntropy(double temperature, double entropy, StatePoint out) {
        note(Kind.TEMPERATURE_ENTROPY, temperature, entropy);
        model.atTemperatureEntropy(temperature, entropy, out);
    }

    @Override
    public void atTemperatureVolume(double temperature, double volume, StatePoint out) {
        note(Kind.TEMPERATURE_VOLUME, temperature, volume);
        model.atTemperatureVolume(temperature, volume, out);
    }

    @Override
    public void atEnthalpyEntropy(double enthalpy, double entropy, StatePoint out) {
        note(Kind.ENTHALPY_ENTROPY, enthalpy, entropy);
        model.atEnthalpyEntropy(enthalpy, entropy, out);
    }

    @Override
    public void atInternalEnergyVolume(double internalEnergy, double volume, StatePoint out) {
        note(Kind.INTERNAL_ENERGY_VOLUME, internalEnergy, volume);
        model.atInternalEnergyVolume(internalEnergy, volume, out);
    }

    @Override
    public void atEntropyVolume(double entropy, double volume, StatePoint out) {
        note(Kind.ENTROPY_VOLUME, entropy, volume);
        model.atEntropyVolume(entropy, volume, out);
    }

    @Override
    public void saturatedAtTemperature(double temperature, PhaseSide side, StatePoint out) {
        note(
                side == PhaseSide.LIQUID ? Kind.SATURATED_LIQUID_AT_TEMPERATURE : Kind.SATURATED_VAPOUR_AT_TEMPERATURE,
                temperature,
                0);
        model.saturatedAtTemperature(temperature, side, out);
    }

    @Override
    public void saturatedAtPressure(double pressure, PhaseSide side, StatePoint out) {
        note(
                side == PhaseSide.LIQUID ? Kind.SATURATED_LIQUID_AT_PRESSURE : Kind.SATURATED_VAPOUR_AT_PRESSURE,
                pressure,
                0);
        model.saturatedAtPressure(pressure, side, out);
    }

    /** The saturation line, noting in the same list. */
    private final class RecordingSaturation implements SaturationModel {
        private final SaturationModel saturation;

        RecordingSaturation(SaturationModel saturation) {
            this.saturation = saturation;
        }

        @Override
        public double lowestTemperature() {
            return saturation.lowestTemperature();
        }

        @Override
        public double lowestPressure() {
            return saturation.lowestPressure();
        }

        @Override
        public double criticalTemperature() {
            return saturation.criticalTemperature();
        }

        @Override
        public double criticalPressure() {
            return saturation.criticalPressure();
        }

        @Override
        public double pressure(double temperature) {
            note(Kind.SATURATION_PRESSURE, temperature, 0);
            return saturation.pressure(temperature);
        }

        @Override
        public double temperature(double pressure) {
            note(Kind.SATURATION_TEMPERATURE, pressure, 0);
            return saturation.temperature(pressure);
        }

        @Override
        public double pressureByTemperature(double temperature) {
            note(Kind.SATURATION_SLOPE, temperature, 0);
            return saturation.pressureByTemperature(temperature);
        }

        @Override
        public Phase phase(double temperature, double pressure, PhaseSide side) {
            return saturation.phase(temperature, pressure, side);
        }
    }
}
