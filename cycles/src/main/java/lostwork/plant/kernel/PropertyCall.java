package lostwork.plant.kernel;

import lostwork.fluid.FluidModel;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;
import org.jspecify.annotations.Nullable;

/**
 * Property functions of one fluid for the solver: value and exact partial derivatives, continued linearly outside the
 * range of the model, with the last state remembered.
 *
 * <p>While a solve is on its way its trial points may leave the range. There the function value at the nearest point of
 * the range is continued along the derivatives, so that every residual stays finite and continuous; {@link #outside}
 * tells that it happened, and no solution is accepted with it. One instance belongs to one workspace and one call site;
 * not thread-safe.
 */
final class PropertyCall {
    /** Relative distance from the saturation pressure within which a state counts as saturated. */
    private static final double SATURATED = 1e-8;

    private final FluidModel model;
    private final PropertyKind kind;
    private final @Nullable SharedState shared;
    private final StatePoint point;
    private final StatePoint liquid;
    private final StatePoint vapour;

    private double lastFirst = Double.NaN;
    private double lastSecond = Double.NaN;
    private double value;
    private double byFirst;
    private double bySecond;
    private boolean outside;
    private boolean ambiguous;

    /**
     * Creates a call site.
     *
     * @param model the fluid
     * @param kind the function
     * @param shared for a function of pressure and enthalpy, the flash that it shares with the other functions of the same
     *     state; null for the other functions
     * @param liquid scratch for the length of one evaluation, shared by all call sites of a workspace
     * @param vapour another one
     */
    PropertyCall(
            FluidModel model, PropertyKind kind, @Nullable SharedState shared, StatePoint liquid, StatePoint vapour) {
        this.model = model;
        this.kind = kind;
        this.shared = shared;
        this.liquid = liquid;
        this.vapour = vapour;
        point = shared == null ? new StatePoint() : shared.point;
    }

    /** {@return the value of the last evaluation} */
    double value() {
        return value;
    }

    /** {@return the partial derivative with respect to the first argument} */
    double byFirst() {
        return byFirst;
    }

    /** {@return the partial derivative with respect to the second argument; 0 where there is none} */
    double bySecond() {
        return bySecond;
    }

    /** {@return whether the last evaluation lay outside the range of the model} */
    boolean outside() {
        return outside;
    }

    /**
     * {@return whether the last evaluation asked for the state at a temperature and its own saturation pressure, a pair
     * that does not tell liquid from vapour}
     */
    boolean ambiguous() {
        return ambiguous;
    }

    /** Evaluates the function; repeated arguments cost nothing. */
    void evaluate(double first, double second) {
        if (first == lastFirst && (second == lastSecond || kind.arguments() == 1)) {
            return;
        }
        outside = false;
        ambiguous = false;
        lastFirst = Double.NaN; // an exception below must not leave a stale hit
        try {
            compute(first, second);
        } catch (OutOfRangeException e) {
            continueFromRange(first, second);
        }
        lastFirst = first;
        lastSecond = second;
    }

    private void compute(double p, double second) {
        switch (kind) {
            case TEMPERATURE_PH -> {
                flash(p, second);
                set(point.temperature, point.temperatureByPressureAtEnthalpy, point.temperatureByEnthalpy);
            }
            case ENTROPY_PH -> {
                flash(p, second);
                set(point.entropy, -point.volume / point.temperature, 1 / point.temperature);
            }
            case VOLUME_PH -> {
                flash(p, second);
                set(point.volume, point.volumeByPressureAtEnthalpy, point.volumeByEnthalpy);
            }
            case VAPOUR_FRACTION_PH -> {
                saturate(p);
                final double span = vapour.enthalpy - liquid.enthalpy;
                final double x = (second - liquid.enthalpy) / span;
                final double liquidSlope = enthalpySlope(liquid);
                set(x, -(liquidSlope + x * (enthalpySlope(vapour) - liquidSlope)) / span, 1 / span);
            }
            case ENTHALPY_PS -> {
                model.atPressureEntropy(p, second, point);
                set(point.enthalpy, point.volume, point.temperature);
            }
            case ENTHALPY_PT -> {
                model.atTemperaturePressure(second, p, point);
                set(point.enthalpy, point.volume - second * point.volumeByTemperature, point.heatCapacity);
                ambiguous = isSaturated(second, p);
            }
            case ENTHALPY_PX -> {
                saturate(p);
                final double span = vapour.enthalpy - liquid.enthalpy;
                final double liquidSlope = enthalpySlope(liquid);
                set(
                        liquid.enthalpy + second * span,
                        liquidSlope + second * (enthalpySlope(vapour) - liquidSlope),
                        span);
            }
            case ENTHALPY_SUPERHEATED -> spanFromSaturation(p, second, PhaseSide.VAPOUR);
            case ENTHALPY_SUBCOOLED -> {
                spanFromSaturation(p, -second, PhaseSide.LIQUID);
                bySecond = -bySecond;
            }
            case SATURATION_TEMPERATURE_P -> {
                saturate(p);
                set(liquid.temperature, saturationSlope(), 0);
            }
        }
    }

    private void flash(double pressure, double enthalpy) {
        if (shared == null) {
            model.atPressureEnthalpy(pressure, enthalpy, point);
        } else {
            shared.at(pressure, enthalpy);
        }
    }

    private boolean isSaturated(double temperature, double pressure) {
        final SaturationModel saturation = model.saturation();
        return saturation != null
                && temperature > saturation.lowestTemperature()
                && temperature < saturation.criticalTemperature()
                && Math.abs(pressure / saturation.pressure(temperature) - 1) < SATURATED;
    }

    private void set(double value, double byFirst, double bySecond) {
        this.value = value;
        this.byFirst = byFirst;
        this.bySecond = bySecond;
    }

    /** dT/dp along the saturation line, from the saturation equation itself. */
    private double saturationSlope() {
        return 1 / requireSaturation().pressureByTemperature(liquid.temperature);
    }

    /** dh/dp of one side along the saturation line. */
    private double enthalpySlope(StatePoint side) {
        return side.volume - side.temperature * side.volumeByTemperature + side.heatCapacity * saturationSlope();
    }

    private void spanFromSaturation(double p, double span, PhaseSide side) {
        saturate(p);
        final double t = liquid.temperature + span;
        model.range().requireTemperature(t);
        model.evaluate(t, p, side, point);
        set(
                point.enthalpy,
                point.volume - t * point.volumeByTemperature + point.heatCapacity * saturationSlope(),
                point.heatCapacity);
    }

    private void saturate(double p) {
        final SaturationModel saturation = requireSaturation();
        final double lowest = saturation.pressure(saturation.lowestTemperature());
        if (!(p >= lowest && p < saturation.criticalPressure())) {
            throw new OutOfRangeException(
                    "pressure", p, lowest, saturation.criticalPressure(), "Pa", "saturation of " + model.name(), "");
        }
        final double t = saturation.temperature(p);
        model.evaluate(t, p, PhaseSide.LIQUID, liquid);
        model.evaluate(t, p, PhaseSide.VAPOUR, vapour);
    }

    private SaturationModel requireSaturation() {
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            throw new IllegalStateException(model.name() + " has no saturation line");
        }
        return saturation;
    }

    /** Moves the arguments into the range, evaluates there and continues linearly. */
    private void continueFromRange(double first, double second) {
        outside = true;
        final double margin = 1e-9;
        final double low;
        final double high;
        if (kind.needsSaturation()) {
            final SaturationModel saturation = requireSaturation();
            low = Math.max(model.range().lowestPressure(), saturation.pressure(saturation.lowestTemperature()));
            high = saturation.criticalPressure() * (1 - 1e-4);
        } else {
            low = model.range().lowestPressure();
            high = model.range().highestPressure();
        }
        final double p = clamp(first, low * (1 + margin), high * (1 - margin));
        final double inside = clampSecond(p, second);
        try {
            compute(p, inside);
        } catch (OutOfRangeException e) {
            // The corner of a range that is no rectangle: come in from the middle.
            compute(p, 0.5 * (inside + middleSecond(p)));
        }
        final double slope = byFirst * (first - p);
        value += (Double.isFinite(slope) ? slope : 0) + bySecond * (second - inside);
    }

    private double clampSecond(double p, double second) {
        final double cold = model.lowestTemperatureAt(p) * (1 + 1e-9);
        final double hot = model.highestTemperatureAt(p) * (1 - 1e-9);
        return switch (kind) {
            case TEMPERATURE_PH, ENTROPY_PH, VOLUME_PH -> {
                final double low = enthalpyAt(cold, p);
                yield clamp(second, low, enthalpyAt(hot, p));
            }
            case ENTHALPY_PS -> {
                final double low = entropyAt(cold, p);
                yield clamp(second, low, entropyAt(hot, p));
            }
            case ENTHALPY_PT -> clamp(second, cold, hot);
            case ENTHALPY_SUPERHEATED ->
                clamp(second, 0, hot - requireSaturation().temperature(p));
            case ENTHALPY_SUBCOOLED -> clamp(second, 0, requireSaturation().temperature(p) - cold);
            default -> second;
        };
    }

    private double middleSecond(double p) {
        final double t = 0.5 * (model.lowestTemperatureAt(p) + model.highestTemperatureAt(p));
        return switch (kind) {
            case TEMPERATURE_PH, ENTROPY_PH, VOLUME_PH -> enthalpyAt(t, p);
            case ENTHALPY_PS -> entropyAt(t, p);
            case ENTHALPY_PT -> t;
            default -> 0;
        };
    }

    private double enthalpyAt(double t, double p) {
        model.atTemperaturePressure(t, p, vapour);
        return vapour.enthalpy;
    }

    private double entropyAt(double t, double p) {
        model.atTemperaturePressure(t, p, vapour);
        return vapour.entropy;
    }

    static double clamp(double x, double low, double high) {
        return Math.max(low, Math.min(high, x));
    }

    /** The flash of one state, shared by every function of its pressure and enthalpy. */
    static final class SharedState {
        private final FluidModel model;
        private final StatePoint point = new StatePoint();
        private double lastPressure = Double.NaN;
        private double lastEnthalpy = Double.NaN;

        SharedState(FluidModel model) {
            this.model = model;
        }

        private void at(double pressure, double enthalpy) {
            if (pressure != lastPressure || enthalpy != lastEnthalpy) {
                lastPressure = Double.NaN; // an exception must not leave a stale hit
                model.atPressureEnthalpy(pressure, enthalpy, point);
                lastPressure = pressure;
                lastEnthalpy = enthalpy;
            }
        }
    }
}
