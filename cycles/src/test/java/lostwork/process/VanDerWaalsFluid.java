package lostwork.process;

import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;

/**
 * The fluid of van der Waals with a constant cv: the simplest one with a liquid, a vapour and a critical point.
 *
 * <p>p = R T/(v − b) − a/v², u = cv T − a/v, s = cv ln T + R ln(v − b). The saturation line is the closed parametric form
 * of J. Lekner, Am. J. Phys. 50 (1982) 161 (from memory; areas across the dome that agree show that both phases have equal
 * Gibbs energies). Constants near those of carbon dioxide, invented for tests. Unlike a formulation by regions it is
 * consistent to rounding across its saturation line, so that the laws can be asked for to 1e-8 there.
 */
final class VanDerWaalsFluid implements FluidModel, SaturationModel {
    private static final double R = 189, CV = 650, TC = 304, PC = 73.8e5;
    private static final double A = 27.0 / 64 * R * R * TC * TC / PC, B = R * TC / (8 * PC);

    @Override
    public String name() {
        return "van der Waals fluid";
    }

    @Override
    public double molarMass() {
        return 0.044;
    }

    @Override
    public FluidRange range() {
        return new FluidRange(150, 1000, 100, 1000e5, "invented for tests");
    }

    @Override
    public Provenance provenance() {
        return Provenance.of("equation of van der Waals");
    }

    @Override
    public SaturationModel saturation() {
        return this;
    }

    @Override
    public void evaluate(double t, double p, PhaseSide side, StatePoint out) {
        final double v = volume(t, p, side);
        final double byVolume = -R * t / ((v - B) * (v - B)) + 2 * A / (v * v * v);
        final double byTemperature = R / (v - B);
        final double u = CV * t - A / v;
        final double s = CV * Math.log(t / TC) + R * Math.log((v - B) / B);
        final double cp = CV - t * byTemperature * byTemperature / byVolume;
        final Phase phase = phase(t, p, side);
        out.setSinglePhase(t, p, v, u + p * v, s, cp, -byTemperature / byVolume, 1 / byVolume, phase);
    }

    /** Newton's method on p v³ − (p b + R T) v² + a v − a b, from the side where it converges without a turn. */
    private static double volume(double t, double p, PhaseSide side) {
        double v = side == PhaseSide.LIQUID ? B : B + R * t / p;
        for (int i = 0; i < 200; i++) {
            final double f = ((p * v - (p * B + R * t)) * v + A) * v - A * B;
            final double slope = (3 * p * v - 2 * (p * B + R * t)) * v + A;
            final double next = v - f / slope;
            if (next == v) {
                break;
            }
            v = next;
        }
        return v;
    }

    /**
     * {@return ∫ p dv along an isotherm in J/kg, in closed form}
     *
     * <p>Through the two-phase region as well: the loop of the equation and the straight line at saturation pressure enclose
     * equal areas (Maxwell), so that both have the same integral.
     */
    static double isothermalWork(double kelvin, double startVolume, double endVolume) {
        return R * kelvin * Math.log((endVolume - B) / (startVolume - B)) + A / endVolume - A / startVolume;
    }

    private static double series(double y) {
        double above = 0, below = 0, odd = y, four = 1;
        for (int k = 1; k < 60 && 2 * k * odd > 1e-17 * above; k++) {
            odd *= y * y / ((2 * k) * (2 * k + 1));
            four *= 4;
            above += 2 * k * odd;
            below += four * odd;
        }
        return above / below;
    }

    /** {@return reduced temperature or reduced pressure at half the entropy of evaporation over R} */
    private static double reduced(double y, boolean pressure) {
        final double f = series(y);
        final double g = 1 + 2 * f * Math.cosh(y) + f * f;
        return pressure ? 27 * f * f * (1 - f * f) / (g * g) : 6.75 * f * (f + Math.cosh(y)) / (g * g);
    }

    private static double parameter(double wanted, boolean pressure) {
        double low = 1e-9, high = 12;
        while (0.5 * (low + high) > low && 0.5 * (low + high) < high) {
            if (reduced(0.5 * (low + high), pressure) > wanted) {
                low = 0.5 * (low + high);
            } else {
                high = 0.5 * (low + high);
            }
        }
        return high;
    }

    @Override
    public double pressure(double t) {
        return PC * reduced(parameter(t / TC, false), true);
    }

    @Override
    public double temperature(double p) {
        return TC * reduced(parameter(p / PC, true), false);
    }

    @Override
    public double lowestTemperature() {
        return 150;
    }

    @Override
    public double criticalTemperature() {
        return TC;
    }

    @Override
    public double criticalPressure() {
        return PC;
    }
}
