package lostwork.fluid.water;

import lostwork.fluid.Phase;
import lostwork.fluid.StatePoint;
import org.jspecify.annotations.Nullable;

/**
 * A basic equation of IAPWS-IF97 for the Gibbs energy: g(p,T)/(R T) = γ(π,τ); regions 1, 2 and 5.
 *
 * <p>γ is a sum over powers of the arguments of the table and, in regions 2 and 5, an ideal-gas part
 * ln π + Σ n τ<sup>J</sup>. The properties follow from R7-97(2012), Tables 3 and 12: v = (R T/p*) γ<sub>π</sub>,
 * h = R T* γ<sub>τ</sub>, s = R (τ γ<sub>τ</sub> − γ), cp = −R τ² γ<sub>ττ</sub>.
 */
final class If97Gibbs {
    /** Enough for a bracketed Newton iteration that halves its bracket when it cannot step. */
    private static final int STEPS = 100;
    /** A last step below this is applied to first order; what it leaves out is below the rounding of h and s. */
    private static final double LAST_STEP_K = 1e-5;
    /** A step below this leads to a last one; backward equations start within 0.025 K. */
    private static final double CLOSE_STEP_K = 0.05;

    private final int region;
    private final double lowestTemperature;
    private final double highestTemperature;
    private final double gasConstant;
    private final double referencePressure;
    private final double referenceTemperature;
    private final double pressureScale;
    private final double pressureFactor;
    private final double pressureOffset;
    private final double temperatureOffset;
    private final PowerSum residual;
    private final @Nullable IdealPart ideal;

    /**
     * Reads an equation.
     *
     * @param region its number, for messages
     * @param residual the table of the sum in both arguments
     * @param ideal the table of the ideal-gas part; null for region 1, which has none
     * @param lowestTemperature where iterations stop, in K; a little below the region
     * @param highestTemperature where iterations stop, in K; a little above the region
     */
    If97Gibbs(
            int region,
            CoefficientTable residual,
            @Nullable CoefficientTable ideal,
            double lowestTemperature,
            double highestTemperature) {
        this.region = region;
        this.lowestTemperature = lowestTemperature;
        this.highestTemperature = highestTemperature;
        gasConstant = residual.constant("R_kJ_kgK");
        referencePressure = residual.argument(0).reference();
        referenceTemperature = residual.argument(1).reference();
        pressureScale = residual.argument(0).scale();
        pressureFactor = Math.signum(pressureScale);
        pressureOffset = residual.argument(0).offset();
        temperatureOffset = residual.argument(1).offset();
        this.residual = PowerSum.of(residual, 1);
        this.ideal = ideal == null ? null : new IdealPart(ideal);
    }

    /** Prepares the workspace for evaluations at one pressure. */
    private void fixPressure(double pressure, Workspace w) {
        residual.fixFirst(pressureScale * pressure + pressureOffset, w);
    }

    /** Writes γ and its derivatives by π (f) and τ (t) into the workspace, after {@link #fixPressure}. */
    private void gamma(double temperature, double pressure, Workspace w) {
        final double pi = pressure / referencePressure;
        final double tau = referenceTemperature / temperature;
        final double x = pressureScale * pressure + pressureOffset;
        final double y = tau + temperatureOffset;
        residual.evaluate(y, w);
        final double byX = pressureFactor / x;
        final double byY = 1 / y;
        w.f *= byX;
        w.t *= byY;
        w.ff *= byX * byX;
        w.tt *= byY * byY;
        w.ft *= byX * byY;
        if (ideal != null) {
            ideal.addTo(pi, tau, w);
        }
    }

    /** Writes γ, γτ (t) and γττ (tt) into the workspace, after {@link #fixPressure}; all that h, s and cp need. */
    private void gammaByTau(double temperature, double pressure, Workspace w) {
        final double tau = referenceTemperature / temperature;
        final double y = tau + temperatureOffset;
        residual.evaluateBySecond(y, w);
        final double byY = 1 / y;
        w.t *= byY;
        w.tt *= byY * byY;
        if (ideal != null) {
            ideal.addTo(pressure / referencePressure, tau, w);
        }
    }

    private void fill(
            double temperature,
            double pressure,
            double step,
            double enthalpy,
            double entropy,
            Workspace w,
            StatePoint out) {
        final double tau = referenceTemperature / temperature;
        final double volume = gasConstant * temperature / referencePressure * w.f;
        final double volumeByTemperature = gasConstant / referencePressure * (w.f - tau * w.ft);
        final double volumeByPressure = gasConstant * temperature / (referencePressure * referencePressure) * w.ff;
        final double t = temperature + step;
        out.setSinglePhase(
                t,
                pressure,
                volume + volumeByTemperature * step,
                enthalpy,
                entropy,
                -gasConstant * tau * tau * w.tt,
                volumeByTemperature,
                volumeByPressure,
                phase(t, pressure));
    }

    private Phase phase(double temperature, double pressure) {
        if (region == 1) {
            return Phase.LIQUID;
        }
        return temperature >= If97Saturation.CRITICAL_TEMPERATURE_K && pressure >= If97Saturation.CRITICAL_PRESSURE_PA
                ? Phase.SUPERCRITICAL
                : Phase.VAPOUR;
    }

    /** Evaluates the properties at a temperature in K and a pressure in Pa. */
    void evaluate(double temperature, double pressure, Workspace w, StatePoint out) {
        fixPressure(pressure, w);
        gamma(temperature, pressure, w);
        final double tau = referenceTemperature / temperature;
        fill(
                temperature,
                pressure,
                0,
                gasConstant * referenceTemperature * w.t,
                gasConstant * (tau * w.t - w.value),
                w,
                out);
    }

    /** {@return h in J/kg} */
    double enthalpy(double temperature, double pressure, Workspace w) {
        fixPressure(pressure, w);
        gammaByTau(temperature, pressure, w);
        return gasConstant * referenceTemperature * w.t;
    }

    /** {@return s in J/(kg K)} */
    double entropy(double temperature, double pressure, Workspace w) {
        fixPressure(pressure, w);
        gammaByTau(temperature, pressure, w);
        return gasConstant * (referenceTemperature / temperature * w.t - w.value);
    }

    /** Finds the state at a pressure and an enthalpy; {@code start} is a first guess of the temperature in K. */
    void atPressureEnthalpy(double pressure, double enthalpy, double start, Workspace w, StatePoint out) {
        fixPressure(pressure, w);
        double lowest = lowestTemperature;
        double highest = highestTemperature;
        double t = Math.max(lowest, Math.min(highest, start));
        boolean close = false;
        double distance = Double.NaN;
        for (int k = 0; k < STEPS; k++) {
            final boolean last = close;
            if (last) {
                gamma(t, pressure, w);
            } else {
                gammaByTau(t, pressure, w);
            }
            final double tau = referenceTemperature / t;
            final double miss = enthalpy - gasConstant * referenceTemperature * w.t;
            final double heatCapacity = -gasConstant * tau * tau * w.tt;
            final double step = miss / heatCapacity;
            if (last && Math.abs(step) <= LAST_STEP_K) {
                final double entropy = gasConstant * (tau * w.t - w.value) + miss / t;
                fill(t, pressure, step, enthalpy, entropy, w, out);
                return;
            }
            if (miss > 0) {
                lowest = t;
            } else {
                highest = t;
            }
            // One more step will do: only now the derivatives by pressure are needed too.
            close = Math.abs(step) <= CLOSE_STEP_K;
            distance = Math.abs(step) / t;
            final double next = t + step;
            t = next > lowest && next < highest ? next : (lowest + highest) / 2;
        }
        throw If97Failure.of("region " + region, "p = " + pressure + " Pa, h = " + enthalpy + " J/kg", distance);
    }

    /** Finds the state at a pressure and an entropy; {@code start} is a first guess of the temperature in K. */
    void atPressureEntropy(double pressure, double entropy, double start, Workspace w, StatePoint out) {
        fixPressure(pressure, w);
        double lowest = lowestTemperature;
        double highest = highestTemperature;
        double t = Math.max(lowest, Math.min(highest, start));
        boolean close = false;
        double distance = Double.NaN;
        for (int k = 0; k < STEPS; k++) {
            final boolean last = close;
            if (last) {
                gamma(t, pressure, w);
            } else {
                gammaByTau(t, pressure, w);
            }
            final double tau = referenceTemperature / t;
            final double miss = entropy - gasConstant * (tau * w.t - w.value);
            final double heatCapacity = -gasConstant * tau * tau * w.tt;
            final double step = miss * t / heatCapacity;
            if (last && Math.abs(step) <= LAST_STEP_K) {
                final double enthalpy = gasConstant * referenceTemperature * w.t + miss * t;
                fill(t, pressure, step, enthalpy, entropy, w, out);
                return;
            }
            if (miss > 0) {
                lowest = t;
            } else {
                highest = t;
            }
            // One more step will do: only now the derivatives by pressure are needed too.
            close = Math.abs(step) <= CLOSE_STEP_K;
            distance = Math.abs(step) / t;
            final double next = t + step;
            t = next > lowest && next < highest ? next : (lowest + highest) / 2;
        }
        throw If97Failure.of("region " + region, "p = " + pressure + " Pa, s = " + entropy + " J/(kg K)", distance);
    }

    /** The part ln π + Σ n τ<sup>J</sup> with consecutive J. */
    private static final class IdealPart {
        private final int lowest;
        /** Coefficients of τ<sup>J</sup>, J τ<sup>J</sup> and J(J-1) τ<sup>J</sup>, J rising. */
        private final double[] value;

        private final double[] first;
        private final double[] second;

        IdealPart(CoefficientTable table) {
            int low = Integer.MAX_VALUE;
            int high = Integer.MIN_VALUE;
            for (int k = 0; k < table.size(); k++) {
                low = Math.min(low, table.exponent(k, 1, 1));
                high = Math.max(high, table.exponent(k, 1, 1));
            }
            lowest = low;
            value = new double[high - low + 1];
            first = new double[value.length];
            second = new double[value.length];
            for (int k = 0; k < table.size(); k++) {
                final int j = table.exponent(k, 1, 1);
                final double n = table.coefficient(k);
                value[j - low] = n;
                first[j - low] = n * j;
                second[j - low] = n * j * (j - 1);
            }
        }

        void addTo(double pi, double tau, Workspace w) {
            double sum = 0;
            double sum1 = 0;
            double sum2 = 0;
            for (int k = value.length - 1; k >= 0; k--) {
                sum = sum * tau + value[k];
                sum1 = sum1 * tau + first[k];
                sum2 = sum2 * tau + second[k];
            }
            final double byTau = 1 / tau;
            double power = 1;
            for (int k = lowest; k < 0; k++) {
                power *= byTau;
            }
            final double byPi = 1 / pi;
            w.value += Math.log(pi) + power * sum;
            w.t += power * byTau * sum1;
            w.tt += power * byTau * byTau * sum2;
            w.f += byPi;
            w.ff -= byPi * byPi;
        }
    }
}
