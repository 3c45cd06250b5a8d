package lostwork.fluid;

import java.util.Locale;

/** Tests derivatives, stability and flashes at single-phase places that fill the range evenly. */
final class SinglePhaseCheck {
    private static final int PLACES = 400;
    /** Step of the differences, relative; the error of the extrapolated difference falls with its fourth power. */
    private static final double STEP = 1e-4;
    /** Above this disagreement of two differences the property is not smooth there. */
    private static final double ROUGH = 1e-3;
    /** The share of rough places, such as seams between two equations, above which they are a finding. */
    private static final double ROUGH_SHARE = 0.1;

    private final FluidModel model;
    private final FluidTolerance tolerance;
    private final Findings findings;
    private final FlashCheck flashes;
    private final StatePoint here = new StatePoint();
    private final StatePoint[] beside = {new StatePoint(), new StatePoint(), new StatePoint(), new StatePoint()};

    SinglePhaseCheck(FluidModel model, FluidTolerance tolerance, Findings findings) {
        this.model = model;
        this.tolerance = tolerance;
        this.findings = findings;
        flashes = new FlashCheck(model, tolerance, findings);
    }

    /** {@return the number of places} */
    int run() {
        final FluidRange range = model.range();
        int places = 0;
        int rough = 0;
        for (int i = 1; i <= PLACES; i++) {
            // Halton's sequence in bases 2 and 3 fills a square evenly.
            final double temperature = range.lowestTemperature()
                    + radicalInverse(i, 2) * (range.highestTemperature() - range.lowestTemperature());
            final double low = Math.log(model.lowestPressureAt(temperature));
            final double high = Math.log(model.highestPressureAt(temperature));
            final double pressure = Math.exp(low + radicalInverse(i, 3) * (high - low));
            if (!holdsAt(temperature, pressure)) {
                continue;
            }
            places++;
            if (!at(temperature, pressure)) {
                rough++;
            }
        }
        if (rough > ROUGH_SHARE * places) {
            findings.add(
                    FluidLaw.CONTINUITY,
                    rough + " of " + places + " places are not smooth",
                    here.temperature,
                    here.pressure,
                    (double) rough / places,
                    ROUGH_SHARE);
        }
        return places;
    }

    private static double radicalInverse(int index, int base) {
        double value = 0;
        double digit = 1.0 / base;
        for (int i = index; i > 0; i /= base) {
            value += digit * (i % base);
            digit /= base;
        }
        return value;
    }

    private boolean holdsAt(double temperature, double pressure) {
        return model.range().contains(temperature, pressure)
                && temperature >= model.lowestTemperatureAt(pressure)
                && temperature <= model.highestTemperatureAt(pressure)
                && pressure >= model.lowestPressureAt(temperature)
                && pressure <= model.highestPressureAt(temperature);
    }

    private PhaseSide side(double temperature, double pressure) {
        final SaturationModel saturation = model.saturation();
        return saturation != null
                        && temperature < saturation.criticalTemperature()
                        && temperature >= saturation.lowestTemperature()
                        && pressure >= saturation.pressure(temperature)
                ? PhaseSide.LIQUID
                : PhaseSide.VAPOUR;
    }

    /** {@return whether the properties are smooth at this place} */
    private boolean at(double temperature, double pressure) {
        final PhaseSide side = side(temperature, pressure);
        try {
            model.evaluate(temperature, pressure, side, here);
        } catch (RuntimeException e) {
            findings.add(FluidLaw.EVALUATION, "refused: " + e, temperature, pressure, Double.POSITIVE_INFINITY, 0);
            return true;
        }
        if (!isEvaluated(temperature, pressure)) {
            return true;
        }
        stability();
        flashes.at(here);
        final double temperatureStep = STEP * temperature;
        boolean smooth = true;
        if (surround(temperature, pressure, temperatureStep, 0, side)) {
            smooth = alongTemperature(temperatureStep);
        }
        // As far as the volume follows: a liquid needs wide steps, since its volume hardly changes.
        final double stiffness = here.volumeByPressure < 0 ? -here.volume / here.volumeByPressure : pressure;
        final double pressureStep = Math.min(STEP * stiffness, 0.4 * pressure);
        if (surround(temperature, pressure, 0, pressureStep, side)) {
            smooth &= alongPressure(pressureStep);
        }
        return smooth;
    }

    private boolean isEvaluated(double temperature, double pressure) {
        findings.compare(
                FluidLaw.EVALUATION,
                "temperature",
                temperature,
                pressure,
                here.temperature,
                temperature,
                temperature,
                0);
        findings.compare(FluidLaw.EVALUATION, "pressure", temperature, pressure, here.pressure, pressure, pressure, 0);
        final double sum = here.volume
                + here.enthalpy
                + here.entropy
                + here.heatCapacity
                + here.volumeByTemperature
                + here.volumeByPressure;
        if (!(Math.abs(sum) <= Double.MAX_VALUE && here.volume > 0)) {
            findings.add(
                    FluidLaw.EVALUATION,
                    String.format(
                            Locale.ROOT,
                            "v = %s, h = %s, s = %s, cp = %s, (∂v/∂T)p = %s, (∂v/∂p)T = %s",
                            here.volume,
                            here.enthalpy,
                            here.entropy,
                            here.heatCapacity,
                            here.volumeByTemperature,
                            here.volumeByPressure),
                    temperature,
                    pressure,
                    Double.POSITIVE_INFINITY,
                    0);
            return false;
        }
        return true;
    }

    private void stability() {
        final double isochoric = here.isochoricHeatCapacity();
        if (!(isochoric > 0)) {
            findings.add(
                    FluidLaw.THERMAL_STABILITY,
                    "cv = " + isochoric + " J/(kg K)",
                    here.temperature,
                    here.pressure,
                    Math.abs(isochoric / here.heatCapacity),
                    0);
        }
        if (!(here.volumeByPressure <= 0)) {
            findings.add(
                    FluidLaw.MECHANICAL_STABILITY,
                    "(∂v/∂p)T = " + here.volumeByPressure + " m³/(kg Pa)",
                    here.temperature,
                    here.pressure,
                    here.pressure * here.volumeByPressure / here.volume,
                    0);
        }
    }

    /** {@return whether the four neighbours at two steps on both sides lie in the range and on the same side} */
    private boolean surround(double temperature, double pressure, double dt, double dp, PhaseSide side) {
        for (int i = 0; i < 4; i++) {
            // -1, -1/2, 1/2, 1
            final double share = i < 2 ? -1 + 0.5 * i : 0.5 * (i - 1);
            final double t = temperature + share * dt;
            final double p = pressure + share * dp;
            if (!holdsAt(t, p) || side(t, p) != side) {
                return false;
            }
            model.evaluate(t, p, side, beside[i]);
        }
        return true;
    }

    private boolean alongTemperature(double step) {
        final double t = here.temperature;
        final double cp = here.heatCapacity;
        final double expansion = Math.max(Math.abs(here.volumeByTemperature), 1e-3 * here.volume / t);
        // All three, even when the first is rough: each law is judged by itself.
        return slope(FluidLaw.HEAT_CAPACITY, "cp", FlashProperty.ENTHALPY, step, cp, Math.abs(cp))
                & slope(FluidLaw.ENTROPY_BY_TEMPERATURE, "cp/T", FlashProperty.ENTROPY, step, cp / t, Math.abs(cp) / t)
                & slope(
                        FluidLaw.VOLUME_BY_TEMPERATURE,
                        "(∂v/∂T)p",
                        FlashProperty.VOLUME,
                        step,
                        here.volumeByTemperature,
                        expansion);
    }

    private boolean alongPressure(double step) {
        final double t = here.temperature;
        final double expansion = Math.max(Math.abs(here.volumeByTemperature), 1e-3 * here.volume / t);
        final double compression = Math.max(Math.abs(here.volumeByPressure), 1e-6 * here.volume / here.pressure);
        return slope(
                        FluidLaw.ENTHALPY_BY_PRESSURE,
                        "v - T (∂v/∂T)p",
                        FlashProperty.ENTHALPY,
                        step,
                        here.volume - t * here.volumeByTemperature,
                        here.volume)
                & slope(
                        FluidLaw.ENTROPY_BY_PRESSURE,
                        "-(∂v/∂T)p",
                        FlashProperty.ENTROPY,
                        step,
                        -here.volumeByTemperature,
                        expansion)
                & slope(
                        FluidLaw.VOLUME_BY_PRESSURE,
                        "(∂v/∂p)T",
                        FlashProperty.VOLUME,
                        step,
                        here.volumeByPressure,
                        compression);
    }

    /** {@return whether the property is smooth; compares a stated slope with the difference of the neighbours} */
    private boolean slope(FluidLaw law, String what, FlashProperty property, double step, double stated, double scale) {
        final double wide = (property.of(beside[3]) - property.of(beside[0])) / (2 * step);
        final double narrow = (property.of(beside[2]) - property.of(beside[1])) / step;
        final double rounding = 16 * Math.ulp(property.of(here)) / step / scale;
        if (Math.abs(wide - narrow) > (ROUGH + rounding) * Math.max(scale, Math.abs(narrow))) {
            return false;
        }
        // Richardson's extrapolation of two central differences
        final double slope = (4 * narrow - wide) / 3;
        findings.compare(
                law, what, here.temperature, here.pressure, stated, slope, scale, tolerance.derivatives() + rounding);
        return true;
    }
}
