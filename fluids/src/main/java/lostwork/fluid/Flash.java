package lostwork.fluid;

import lostwork.fluid.BracketedNewton.Outcome;
import lostwork.quantity.OutOfRangeException;

/** The state pairs of models that bring no inverse of their own: range checks, the searches, and what they refuse. */
final class Flash {
    /** Relative width of the saturation line for a temperature and a pressure, wider than its own rounding. */
    private static final double LINE_WIDTH = 1e-10;

    /** Relative distance below which a search of a pair ended at a jump rather than at an end of the range. */
    private static final double SMALL_JUMP = 1e-3;

    private Flash() {}

    static void temperaturePressure(FluidModel model, double temperature, double pressure, StatePoint out) {
        requireTemperature(model, temperature);
        requirePressure(model, pressure);
        requireTemperatureAt(model, pressure, temperature);
        requirePressureAt(model, temperature, pressure);
        final SaturationModel saturation = model.saturation();
        final PhaseSide side = saturation != null
                        && temperature < saturation.criticalTemperature()
                        && temperature >= saturation.lowestTemperature()
                        && pressure >= saturation.pressure(temperature) * (1 - LINE_WIDTH)
                ? PhaseSide.LIQUID
                : PhaseSide.VAPOUR;
        model.evaluate(temperature, pressure, side, out);
    }

    static void pressureEnthalpy(FluidModel model, double pressure, double enthalpy, StatePoint out) {
        atPressure(model, pressure, FlashProperty.ENTHALPY, enthalpy, out);
    }

    static void pressureEntropy(FluidModel model, double pressure, double entropy, StatePoint out) {
        atPressure(model, pressure, FlashProperty.ENTROPY, entropy, out);
    }

    static void pressureVolume(FluidModel model, double pressure, double volume, StatePoint out) {
        atPressure(model, pressure, FlashProperty.VOLUME, volume, out);
    }

    static void temperatureEntropy(FluidModel model, double temperature, double entropy, StatePoint out) {
        atTemperature(model, temperature, FlashProperty.ENTROPY, entropy, out);
    }

    static void temperatureVolume(FluidModel model, double temperature, double volume, StatePoint out) {
        atTemperature(model, temperature, FlashProperty.VOLUME, volume, out);
    }

    private static void atPressure(
            FluidModel model, double pressure, FlashProperty property, double asked, StatePoint out) {
        requirePressure(model, pressure);
        requireValue(property, asked);
        final Outcome outcome = PressureFlash.find(model, pressure, property, asked, Double.NaN, out);
        if (outcome == Outcome.STUCK) {
            throw stuck(model, "p = " + pressure + " Pa and " + property.with(asked), out.innerSearch());
        }
        if (outcome != Outcome.FOUND) {
            temperaturePressure(model, model.lowestTemperatureAt(pressure), pressure, out);
            double lowest = property.of(out);
            if (outcome == Outcome.BELOW && property == FlashProperty.VOLUME) {
                lowest = Math.min(lowest, leastVolume(model, pressure, out));
            }
            temperaturePressure(model, model.highestTemperatureAt(pressure), pressure, out);
            throw outside(model, property, asked, lowest, property.of(out), "p = " + pressure + " Pa");
        }
    }

    /** {@return the volume at the end of the search, which is the least one where a liquid contracts on heating} */
    private static double leastVolume(FluidModel model, double pressure, StatePoint out) {
        temperaturePressure(model, out.innerSearch().low, pressure, out);
        return out.volume;
    }

    private static void atTemperature(
            FluidModel model, double temperature, FlashProperty property, double asked, StatePoint out) {
        requireTemperature(model, temperature);
        requireValue(property, asked);
        final Outcome outcome = TemperatureFlash.find(model, temperature, property, asked, Double.NaN, out);
        if (outcome == Outcome.STUCK) {
            throw stuck(model, "T = " + temperature + " K and " + property.with(asked), out.innerSearch());
        }
        if (outcome != Outcome.FOUND) {
            temperaturePressure(model, temperature, model.lowestPressureAt(temperature), out);
            final double highest = property.of(out);
            temperaturePressure(model, temperature, model.highestPressureAt(temperature), out);
            throw outside(model, property, asked, property.of(out), highest, "T = " + temperature + " K");
        }
    }

    static void enthalpyEntropy(FluidModel model, double enthalpy, double entropy, StatePoint out) {
        requireValue(FlashProperty.ENTHALPY, enthalpy);
        requireValue(FlashProperty.ENTROPY, entropy);
        final Outcome outcome = PairFlash.enthalpyEntropy(model, enthalpy, entropy, out);
        if (outcome != Outcome.FOUND) {
            throw noPair(
                    model,
                    FlashProperty.ENTHALPY.with(enthalpy) + " and " + FlashProperty.ENTROPY.with(entropy),
                    outcome,
                    out.outerSearch());
        }
    }

    static void internalEnergyVolume(FluidModel model, double internalEnergy, double volume, StatePoint out) {
        withVolume(model, FlashProperty.INTERNAL_ENERGY, internalEnergy, volume, out);
    }

    static void entropyVolume(FluidModel model, double entropy, double volume, StatePoint out) {
        withVolume(model, FlashProperty.ENTROPY, entropy, volume, out);
    }

    private static void withVolume(
            FluidModel model, FlashProperty property, double asked, double volume, StatePoint out) {
        requireValue(property, asked);
        requireValue(FlashProperty.VOLUME, volume);
        final Outcome outcome = PairFlash.withVolume(model, property, asked, volume, out);
        if (outcome != Outcome.FOUND) {
            throw noPair(
                    model,
                    property.with(asked) + " and " + FlashProperty.VOLUME.with(volume),
                    outcome,
                    out.outerSearch());
        }
    }

    static void temperatureVapourFraction(FluidModel model, double temperature, double fraction, StatePoint out) {
        final SaturationModel saturation = requireSaturationAt(model, temperature);
        twoPhase(model, saturation, temperature, saturation.pressure(temperature), fraction, out);
    }

    static void pressureVapourFraction(FluidModel model, double pressure, double fraction, StatePoint out) {
        final SaturationModel saturation = requireSaturationAtPressure(model, pressure);
        twoPhase(model, saturation, saturation.temperature(pressure), pressure, fraction, out);
    }

    private static void twoPhase(
            FluidModel model,
            SaturationModel saturation,
            double temperature,
            double pressure,
            double fraction,
            StatePoint out) {
        if (!(fraction >= 0 && fraction <= 1)) {
            throw new OutOfRangeException("vapour fraction", fraction, 0, 1, "1", "lever rule", "");
        }
        // A saturation line may reach beyond the range of its model, such as up to a critical point above it.
        requirePressure(model, pressure);
        final StatePoint liquid = out.liquidSide();
        final StatePoint vapour = out.vapourSide();
        model.evaluate(temperature, pressure, PhaseSide.LIQUID, liquid);
        model.evaluate(temperature, pressure, PhaseSide.VAPOUR, vapour);
        out.setTwoPhase(liquid, vapour, fraction, saturation.pressureByTemperature(temperature));
    }

    static void saturatedAtTemperature(FluidModel model, double temperature, PhaseSide side, StatePoint out) {
        final SaturationModel saturation = requireSaturationAt(model, temperature);
        saturated(model, temperature, saturation.pressure(temperature), side, out);
    }

    static void saturatedAtPressure(FluidModel model, double pressure, PhaseSide side, StatePoint out) {
        final SaturationModel saturation = requireSaturationAtPressure(model, pressure);
        saturated(model, saturation.temperature(pressure), pressure, side, out);
    }

    private static void saturated(
            FluidModel model, double temperature, double pressure, PhaseSide side, StatePoint out) {
        requirePressure(model, pressure);
        model.evaluate(temperature, pressure, side, out);
        out.vapourFraction = side == PhaseSide.LIQUID ? 0 : 1;
    }

    static SaturationModel requireSaturation(FluidModel model) {
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            throw new UndefinedPropertyException(
                    "saturation",
                    model.name(),
                    "its model knows one phase only",
                    "give another pair, such as temperature and pressure, or take a model with liquid and vapour");
        }
        return saturation;
    }

    private static SaturationModel requireSaturationAt(FluidModel model, double temperature) {
        final SaturationModel saturation = requireSaturation(model);
        final double lowest = saturation.lowestTemperature();
        final double highest = saturation.criticalTemperature();
        if (!(temperature >= lowest && temperature <= highest)) {
            throw new OutOfRangeException(
                    "saturation temperature",
                    temperature,
                    lowest,
                    highest,
                    "K",
                    "saturation line of " + model.name(),
                    "");
        }
        return saturation;
    }

    private static SaturationModel requireSaturationAtPressure(FluidModel model, double pressure) {
        final SaturationModel saturation = requireSaturation(model);
        final double lowest = saturation.lowestPressure();
        final double highest = saturation.criticalPressure();
        if (!(pressure >= lowest && pressure <= highest)) {
            throw new OutOfRangeException(
                    "saturation pressure", pressure, lowest, highest, "Pa", "saturation line of " + model.name(), "");
        }
        return saturation;
    }

    private static void requireTemperature(FluidModel model, double temperature) {
        model.range().requireTemperature(temperature);
    }

    private static void requirePressure(FluidModel model, double pressure) {
        model.range().requirePressure(pressure);
    }

    private static void requireTemperatureAt(FluidModel model, double pressure, double temperature) {
        final double lowest = model.lowestTemperatureAt(pressure);
        final double highest = model.highestTemperatureAt(pressure);
        if (!(temperature >= lowest && temperature <= highest)) {
            throw new OutOfRangeException(
                    "temperature",
                    temperature,
                    lowest,
                    highest,
                    "K",
                    model.range().limitedBy() + " at p = " + pressure + " Pa",
                    FluidRange.WAY_OUT);
        }
    }

    private static void requirePressureAt(FluidModel model, double temperature, double pressure) {
        final double lowest = model.lowestPressureAt(temperature);
        final double highest = model.highestPressureAt(temperature);
        if (!(pressure >= lowest && pressure <= highest)) {
            throw new OutOfRangeException(
                    "pressure",
                    pressure,
                    lowest,
                    highest,
                    "Pa",
                    model.range().limitedBy() + " at T = " + temperature + " K",
                    FluidRange.WAY_OUT);
        }
    }

    private static void requireValue(FlashProperty property, double asked) {
        final double lowest = property == FlashProperty.VOLUME ? Double.MIN_VALUE : -Double.MAX_VALUE;
        if (!(asked >= lowest && asked <= Double.MAX_VALUE)) {
            throw new OutOfRangeException(
                    property.words(), asked, lowest, Double.MAX_VALUE, property.unit(), "any fluid", "");
        }
    }

    private static OutOfRangeException outside(
            FluidModel model, FlashProperty property, double asked, double lowest, double highest, String where) {
        return new OutOfRangeException(
                property.words(),
                asked,
                lowest,
                highest,
                property.unit(),
                model.range().limitedBy() + " at " + where,
                FluidRange.WAY_OUT);
    }

    private static FlashException stuck(FluidModel model, String search, BracketedNewton by) {
        return new FlashException(
                model.name(),
                search,
                by.distance,
                by.iterations,
                "the model jumps there or its derivatives contradict it: check it with FluidCheck");
    }

    private static FlashException noPair(FluidModel model, String search, Outcome outcome, BracketedNewton by) {
        return outcome == Outcome.STUCK && by.distance < SMALL_JUMP
                ? stuck(model, search, by)
                : FlashException.outside(model, search, by.distance, by.iterations);
    }
}
