package lostwork.component;

import lostwork.fluid.FlashException;
import lostwork.fluid.FluidModel;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;

/**
 * The temperature of one stream along an exchanger, as a function of the share z of the duty: enthalpy and pressure run
 * linearly in z between the two ends. Gives the places where the stream begins or ends to boil or condense.
 *
 * <p>Outside the range of the fluid the temperature at the nearest point of the range is continued linearly, so that trial
 * points of a solver stay finite. Keeps scratch values; one thread at a time. SI units throughout.
 */
final class ExchangerSide {
    /** How many numbers describe a side: pressure and enthalpy at z = 0, then at z = 1. */
    static final int ARGUMENTS = 4;

    private static final int LIQUID = 0;
    private static final int VAPOUR = 1;
    private static final int KINK_ITERATIONS = 60;
    /** Share of the critical pressure above which heat capacities of liquid and vapour rise steeply to saturation. */
    private static final double NEARLY_ALIKE = 0.6;
    /** Closer to the critical pressure than this the two kinks are one, and none is looked for. */
    private static final double NEARLY_CRITICAL = 1 - 1e-6;

    private final FluidModel model;
    private final StatePoint point = new StatePoint();
    private final StatePoint liquid = new StatePoint();
    private final StatePoint vapour = new StatePoint();
    private final StatePoint edge = new StatePoint();

    private double pressure0;
    private double enthalpy0;
    private double pressureRise;
    private double enthalpyRise;

    private double saturatedAt = Double.NaN;
    private double boilingSlope;
    private final double[] saturatedEnthalpy = new double[2];
    private final double[] saturatedEnthalpySlope = new double[2];

    private int kinks;
    private final double[] kink = new double[2];
    private final double[] kinkTemperature = new double[2];
    private final double[] kinkTemperatureSlope = new double[2];
    private final double[][] kinkGradient = new double[2][ARGUMENTS];

    private double temperature;
    private double byPressure;
    private double byEnthalpy;

    ExchangerSide(FluidModel model) {
        this.model = model;
    }

    /** Takes pressure and enthalpy at both ends, and finds the kinks between them. */
    void set(double[] x, int offset) {
        pressure0 = x[offset];
        enthalpy0 = x[offset + 1];
        pressureRise = x[offset + 2] - x[offset];
        enthalpyRise = x[offset + 3] - x[offset + 1];
        findKinks();
    }

    /**
     * {@return whether the temperature may bend strongly without a kink: at and above the pressures where the two phases
     * become alike}
     */
    boolean bendsStrongly() {
        final SaturationModel saturation = model.saturation();
        return saturation != null
                && Math.max(pressure0, pressure0 + pressureRise) > NEARLY_ALIKE * saturation.criticalPressure();
    }

    /** {@return the number of kinks strictly between the ends} */
    int kinks() {
        return kinks;
    }

    /** {@return the share of the duty at which a kink lies} */
    double kink(int index) {
        return kink[index];
    }

    /** {@return the partial derivatives of the place of a kink with respect to the numbers of this side} */
    double[] kinkGradient(int index) {
        return kinkGradient[index];
    }

    /** {@return the temperature found last} */
    double temperature() {
        return temperature;
    }

    /** {@return the derivative of the temperature found last along the exchanger, per unit of z} */
    double slope() {
        return byPressure * pressureRise + byEnthalpy * enthalpyRise;
    }

    /** Adds the partial derivatives of the temperature found last, at a fixed place, to a gradient. */
    void addGradient(double factor, double z, double[] gradient, int offset) {
        gradient[offset] += factor * byPressure * (1 - z);
        gradient[offset + 1] += factor * byEnthalpy * (1 - z);
        gradient[offset + 2] += factor * byPressure * z;
        gradient[offset + 3] += factor * byEnthalpy * z;
    }

    /** Finds the temperature at a place. */
    void at(double z) {
        final double p = pressure0 + z * pressureRise;
        final double h = enthalpy0 + z * enthalpyRise;
        if (p == saturatedAt && h > saturatedEnthalpy[LIQUID] && h < saturatedEnthalpy[VAPOUR]) {
            temperature = liquid.temperature;
            byPressure = boilingSlope;
            byEnthalpy = 0;
            return;
        }
        try {
            model.atPressureEnthalpy(p, h, point);
            take(0, 0);
        } catch (OutOfRangeException | FlashException e) {
            continueFromRange(p, h);
        }
    }

    /** Takes the temperature at a kink: there it is that of saturation, with the derivatives of the two-phase side. */
    void atKink(int index) {
        temperature = kinkTemperature[index];
        byPressure = kinkTemperatureSlope[index];
        byEnthalpy = 0;
    }

    private void take(double beyondPressure, double beyondEnthalpy) {
        byPressure = point.temperatureByPressureAtEnthalpy;
        byEnthalpy = point.temperatureByEnthalpy;
        temperature = point.temperature + byPressure * beyondPressure + byEnthalpy * beyondEnthalpy;
    }

    private void continueFromRange(double p, double h) {
        final double low = model.range().lowestPressure() * (1 + 1e-9);
        final double high = model.range().highestPressure() * (1 - 1e-9);
        final double pressure = Math.max(low, Math.min(high, p));
        final double cold = enthalpyAt(model.lowestTemperatureAt(pressure) * (1 + 1e-9), pressure);
        final double hot = enthalpyAt(model.highestTemperatureAt(pressure) * (1 - 1e-9), pressure);
        final double enthalpy = Math.max(cold, Math.min(hot, h));
        try {
            model.atPressureEnthalpy(pressure, enthalpy, point);
        } catch (OutOfRangeException | FlashException e) {
            // The corner of a range that is no rectangle: come in from the middle.
            model.atPressureEnthalpy(pressure, 0.5 * (enthalpy + 0.5 * (cold + hot)), point);
        }
        take(p - pressure, h - point.enthalpy);
    }

    private double enthalpyAt(double t, double p) {
        model.atTemperaturePressure(t, p, edge);
        return edge.enthalpy;
    }

    // ------------------------------------------------------------------------------------------------- kinks

    private void findKinks() {
        kinks = 0;
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            return;
        }
        final double p1 = pressure0 + pressureRise;
        final double lowest = saturation.lowestPressure();
        final double highest = NEARLY_CRITICAL * saturation.criticalPressure();
        if (!(Math.min(pressure0, p1) > lowest && Math.max(pressure0, p1) < highest)) {
            return;
        }
        try {
            findKink(saturation, LIQUID);
            findKink(saturation, VAPOUR);
        } catch (OutOfRangeException | FlashException e) {
            kinks = 0; // saturation so near the critical point is not resolved by the model
        }
    }

    /** Solves h(z) = h_saturated(p(z)) where the ends lie on different sides of it. */
    private void findKink(SaturationModel saturation, int side) {
        saturate(saturation, pressure0);
        final double at0 = enthalpy0 - saturatedEnthalpy[side];
        if (pressureRise != 0) {
            saturate(saturation, pressure0 + pressureRise);
        }
        final double at1 = enthalpy0 + enthalpyRise - saturatedEnthalpy[side];
        if (!(at0 < 0 && at1 > 0 || at0 > 0 && at1 < 0)) {
            return;
        }
        double z = at0 / (at0 - at1);
        if (pressureRise != 0) {
            z = refine(saturation, side, z, at0 < 0);
        }
        final double along = enthalpyRise - saturatedEnthalpySlope[side] * pressureRise;
        final double[] gradient = kinkGradient[kinks];
        gradient[0] = saturatedEnthalpySlope[side] * (1 - z) / along;
        gradient[1] = -(1 - z) / along;
        gradient[2] = saturatedEnthalpySlope[side] * z / along;
        gradient[3] = -z / along;
        kink[kinks] = z;
        kinkTemperature[kinks] = liquid.temperature;
        kinkTemperatureSlope[kinks] = boilingSlope;
        kinks++;
    }

    /** Newton iteration inside 0 .. 1, bisected where it leaves; the saturated states are left at the place found. */
    private double refine(SaturationModel saturation, int side, double start, boolean rising) {
        double low = 0;
        double high = 1;
        double z = start;
        for (int i = 0; i < KINK_ITERATIONS; i++) {
            saturate(saturation, pressure0 + z * pressureRise);
            final double gap = enthalpy0 + z * enthalpyRise - saturatedEnthalpy[side];
            if (gap < 0 == rising) {
                low = z;
            } else {
                high = z;
            }
            final double next = z - gap / (enthalpyRise - saturatedEnthalpySlope[side] * pressureRise);
            final double chosen = next >= low && next <= high ? next : 0.5 * (low + high);
            if (Math.abs(chosen - z) <= 1e-15) {
                break;
            }
            z = chosen;
        }
        return z;
    }

    /** The saturated states at a pressure, and how they move with it (Clausius–Clapeyron). */
    private void saturate(SaturationModel saturation, double pressure) {
        if (pressure == saturatedAt) {
            return;
        }
        saturatedAt = Double.NaN; // an exception below must not leave a stale hit
        final double t = saturation.temperature(pressure);
        model.evaluate(t, pressure, PhaseSide.LIQUID, liquid);
        model.evaluate(t, pressure, PhaseSide.VAPOUR, vapour);
        boilingSlope = t * (vapour.volume - liquid.volume) / (vapour.enthalpy - liquid.enthalpy);
        saturatedEnthalpy[LIQUID] = liquid.enthalpy;
        saturatedEnthalpy[VAPOUR] = vapour.enthalpy;
        saturatedEnthalpySlope[LIQUID] = alongSaturation(liquid);
        saturatedEnthalpySlope[VAPOUR] = alongSaturation(vapour);
        saturatedAt = pressure;
    }

    private double alongSaturation(StatePoint side) {
        return side.volume - side.temperature * side.volumeByTemperature + side.heatCapacity * boilingSlope;
    }
}
