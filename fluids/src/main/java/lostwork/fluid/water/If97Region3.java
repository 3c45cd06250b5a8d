package lostwork.fluid.water;

import lostwork.fluid.Phase;
import lostwork.fluid.StatePoint;

/**
 * The basic equation of IAPWS-IF97 for region 3: f(ρ,T)/(R T) = φ(δ,τ), R7-97(2012), equation 28.
 *
 * <p>Density and temperature are the natural pair. Pressure with enthalpy, pressure with entropy, and enthalpy with
 * entropy are found by Newton's method in density and temperature, whose Jacobian stays regular at the critical point:
 * the determinant holds T (∂p/∂T)²<sub>ρ</sub>/ρ² beside (∂p/∂ρ)<sub>T</sub> cv.
 */
final class If97Region3 {
    static final int STEPS = 60;
    /** Newton stops when both relative steps are below this; convergence is quadratic, so the error is below rounding. */
    private static final double LAST_RELATIVE_STEP = 1e-9;

    /** Newton in density alone stops here, in one direction only, with quadratic convergence. */
    private static final double LAST_DENSITY_STEP = 1e-11;

    private static final double CLOSED_BRACKET = 1e-14;
    private static final double CLOSED_PRESSURE = 1e-12;

    private static final double LOWEST_DENSITY = 60;
    private static final double HIGHEST_DENSITY = 800;

    private final double gasConstant;
    private final double referenceDensity;
    private final double referenceTemperature;
    private final double logarithmCoefficient;
    private final PowerSum sum;

    If97Region3(CoefficientTable table) {
        gasConstant = table.constant("R_kJ_kgK");
        logarithmCoefficient = table.constant("n1");
        referenceDensity = table.argument(0).reference();
        referenceTemperature = table.argument(1).reference();
        sum = PowerSum.of(table, 1);
    }

    /** Writes φ and the logarithmic derivatives δ φδ (f), τ φτ (t), δ² φδδ (ff), τ² φττ (tt), δ τ φδτ (ft). */
    private void phi(double density, double temperature, Workspace w) {
        final double delta = density / referenceDensity;
        sum.fixFirst(delta, w);
        sum.evaluate(referenceTemperature / temperature, w);
        w.value += logarithmCoefficient * Math.log(delta);
        w.f += logarithmCoefficient;
        w.ff -= logarithmCoefficient;
    }

    /** {@return p in Pa} */
    double pressure(double density, double temperature, Workspace w) {
        phi(density, temperature, w);
        return density * gasConstant * temperature * w.f;
    }

    /** Evaluates the properties at a density in kg/m³ and a temperature in K. */
    void evaluate(double density, double temperature, Phase phase, Workspace w, StatePoint out) {
        phi(density, temperature, w);
        final double rt = gasConstant * temperature;
        fill(density, temperature, density * rt * w.f, rt * (w.t + w.f), gasConstant * (w.t - w.value), phase, w, out);
    }

    /** Fills a point from the sums in the workspace; pressure, enthalpy and entropy may be those that were asked for. */
    private void fill(
            double density,
            double temperature,
            double pressure,
            double enthalpy,
            double entropy,
            Phase phase,
            Workspace w,
            StatePoint out) {
        final double rt = gasConstant * temperature;
        final double pressureByDensity = rt * (2 * w.f + w.ff);
        final double pressureByTemperature = density * gasConstant * (w.f - w.ft);
        final double cv = -gasConstant * w.tt;
        final double square = density * density;
        final double determinant =
                pressureByDensity * cv + temperature * pressureByTemperature * pressureByTemperature / square;
        out.setSinglePhase(
                temperature,
                pressure,
                1 / density,
                enthalpy,
                entropy,
                determinant / pressureByDensity,
                pressureByTemperature / (square * pressureByDensity),
                -1 / (square * pressureByDensity),
                phase);
        // The derivatives with pressure and enthalpy stay finite where those above diverge, at the critical point.
        final double enthalpyByDensity = (pressureByDensity - temperature * pressureByTemperature / density) / density;
        final double enthalpyByTemperature = cv + pressureByTemperature / density;
        out.temperatureByEnthalpy = pressureByDensity / determinant;
        out.temperatureByPressureAtEnthalpy = -enthalpyByDensity / determinant;
        out.volumeByEnthalpy = pressureByTemperature / (square * determinant);
        out.volumeByPressureAtEnthalpy = -enthalpyByTemperature / (square * determinant);
    }

    /**
     * {@return the density in kg/m³ at a temperature and a pressure; NaN if the branch has no such density, with the relative
     * distance in pressure as the value of the workspace}
     *
     * <p>Newton's method from the dense end on the dense branch, where p(ρ) is convex, and from the dilute end on the
     * other, where it is concave, so that it comes in from one side; a bracket guards it.
     *
     * @param dense whether the branch above the critical density is meant
     */
    double density(double temperature, double pressure, boolean dense, double start, Workspace w) {
        double lowest = LOWEST_DENSITY;
        double highest = HIGHEST_DENSITY;
        double density = Math.max(lowest, Math.min(highest, start));
        final double rt = gasConstant * temperature;
        for (int k = 0; k < STEPS; k++) {
            phi(density, temperature, w);
            final double miss = pressure - density * rt * w.f;
            final double slope = rt * (2 * w.f + w.ff);
            // Between the spinodals the slope is negative: the branch lies towards its own end.
            if (slope <= 0) {
                if (dense) {
                    lowest = density;
                } else {
                    highest = density;
                }
            } else if (miss > 0) {
                lowest = density;
            } else {
                highest = density;
            }
            final double step = miss / slope;
            final double next = density + step;
            if (slope > 0 && Math.abs(step) <= LAST_DENSITY_STEP * density) {
                return next;
            }
            if (slope > 0 && next > lowest && next < highest) {
                density = next;
            } else if (highest - lowest > CLOSED_BRACKET * density) {
                density = (lowest + highest) / 2;
            } else {
                // Near the critical point p(ρ) is so flat that rounding moves the step; the pressure decides.
                if (Math.abs(miss) <= CLOSED_PRESSURE * pressure) {
                    return density;
                }
                w.value = Math.abs(miss) / pressure;
                return Double.NaN;
            }
        }
        return Double.NaN;
    }

    /** Finds the state at a pressure and an enthalpy from first guesses; false if Newton's method does not arrive. The caller
     * sets the phase. */
    boolean atPressureEnthalpy(
            double pressure, double enthalpy, double density, double temperature, Workspace w, StatePoint out) {
        double d = density;
        double t = temperature;
        for (int k = 0; k < STEPS; k++) {
            phi(d, t, w);
            final double rt = gasConstant * t;
            final double missP = pressure - d * rt * w.f;
            final double missH = enthalpy - rt * (w.t + w.f);
            final double pd = rt * (2 * w.f + w.ff);
            final double pt = d * gasConstant * (w.f - w.ft);
            final double cv = -gasConstant * w.tt;
            final double hd = (pd - t * pt / d) / d;
            final double ht = cv + pt / d;
            final double determinant = pd * cv + t * pt * pt / (d * d);
            final double stepT = (pd * missH - hd * missP) / determinant;
            final double stepD = (ht * missP - pt * missH) / determinant;
            if (Math.abs(stepT) <= LAST_RELATIVE_STEP * t && Math.abs(stepD) <= LAST_RELATIVE_STEP * d) {
                // s to first order: T ds = dh - v dp
                final double entropy = gasConstant * (w.t - w.value) + (missH - missP / d) / t;
                fill(d + stepD, t + stepT, pressure, enthalpy, entropy, Phase.SUPERCRITICAL, w, out);
                return true;
            }
            w.value = Math.max(Math.abs(stepT) / t, Math.abs(stepD) / d);
            d = limited(d, stepD);
            t = limited(t, stepT);
        }
        return false;
    }

    /** Finds the state at a pressure and an entropy from first guesses; false if Newton's method does not arrive. The caller
     * sets the phase. */
    boolean atPressureEntropy(
            double pressure, double entropy, double density, double temperature, Workspace w, StatePoint out) {
        double d = density;
        double t = temperature;
        for (int k = 0; k < STEPS; k++) {
            phi(d, t, w);
            final double rt = gasConstant * t;
            final double missP = pressure - d * rt * w.f;
            final double missS = entropy - gasConstant * (w.t - w.value);
            final double pd = rt * (2 * w.f + w.ff);
            final double pt = d * gasConstant * (w.f - w.ft);
            final double cv = -gasConstant * w.tt;
            final double sd = -pt / (d * d);
            final double determinant = pd * cv / t - pt * sd;
            final double stepT = (pd * missS - sd * missP) / determinant;
            final double stepD = (cv / t * missP - pt * missS) / determinant;
            if (Math.abs(stepT) <= LAST_RELATIVE_STEP * t && Math.abs(stepD) <= LAST_RELATIVE_STEP * d) {
                final double enthalpy = rt * (w.t + w.f) + t * missS + missP / d;
                fill(d + stepD, t + stepT, pressure, enthalpy, entropy, Phase.SUPERCRITICAL, w, out);
                return true;
            }
            w.value = Math.max(Math.abs(stepT) / t, Math.abs(stepD) / d);
            d = limited(d, stepD);
            t = limited(t, stepT);
        }
        return false;
    }

    /**
     * Finds the state at an enthalpy and an entropy from first guesses; false if Newton's method does not arrive. The
     * caller sets the phase.
     */
    boolean atEnthalpyEntropy(
            double enthalpy, double entropy, double density, double temperature, Workspace w, StatePoint out) {
        double d = density;
        double t = temperature;
        for (int k = 0; k < STEPS; k++) {
            phi(d, t, w);
            final double rt = gasConstant * t;
            final double missH = enthalpy - rt * (w.t + w.f);
            final double missS = entropy - gasConstant * (w.t - w.value);
            final double pd = rt * (2 * w.f + w.ff);
            final double pt = d * gasConstant * (w.f - w.ft);
            final double cv = -gasConstant * w.tt;
            final double hd = (pd - t * pt / d) / d;
            final double ht = cv + pt / d;
            final double sd = -pt / (d * d);
            final double determinant = hd * cv / t - ht * sd;
            final double stepT = (hd * missS - sd * missH) / determinant;
            final double stepD = (cv / t * missH - ht * missS) / determinant;
            if (Math.abs(stepT) <= LAST_RELATIVE_STEP * t && Math.abs(stepD) <= LAST_RELATIVE_STEP * d) {
                final double pressure = d * rt * w.f + pd * stepD + pt * stepT;
                fill(d + stepD, t + stepT, pressure, enthalpy, entropy, Phase.SUPERCRITICAL, w, out);
                return true;
            }
            w.value = Math.max(Math.abs(stepT) / t, Math.abs(stepD) / d);
            d = limited(d, stepD);
            t = limited(t, stepT);
        }
        return false;
    }

    /** A step of at most a tenth. */
    private static double limited(double value, double step) {
        return value + Math.max(-0.1 * value, Math.min(0.1 * value, step));
    }
}
