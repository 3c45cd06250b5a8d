package lostwork.fluid;

/**
 * A fluid of one's own in under 60 lines: a liquid with a linear volume and a perfect-gas vapour.
 *
 * <p>Both phases follow from one Gibbs energy each, so that they are consistent: with v = VL (1 + A (T − T0) − K (p − P0))
 * the enthalpy rises by (∂h/∂p) = v − T (∂v/∂T) and the entropy falls by (∂s/∂p) = −(∂v/∂T). Invented data, near those of
 * a light hydrocarbon. The saturation line is where the Gibbs energies are equal, and ends
 * where the range does, before the two phases would meet.
 */
final class TwoPhaseExample implements FluidModel, SaturationModel {
    private static final double R = 115, CP = 1650, C = 2300, L0 = 380e3, T0 = 300, P0 = 6e4;
    private static final double VL = 1.6e-3, A = 1.5e-3, K = 2e-9;

    @Override
    public String name() {
        return "example fluid";
    }

    @Override
    public double molarMass() {
        return 0.0723;
    }

    @Override
    public FluidRange range() {
        return new FluidRange(250, 500, 1e3, 10e5, "invented for tests");
    }

    @Override
    public Provenance provenance() {
        return Provenance.of("linear liquid, perfect-gas vapour").withDatum("h = s = 0 in the liquid at 300 K");
    }

    @Override
    public SaturationModel saturation() {
        return this;
    }

    @Override
    public void evaluate(double t, double p, PhaseSide side, StatePoint out) {
        final double ln = Math.log(t / T0);
        if (side == PhaseSide.LIQUID) {
            final double v = VL * (1 + A * (t - T0) - K * (p - P0));
            final double h = C * (t - T0) + VL * (p - P0) * (1 - A * T0 - 0.5 * K * (p - P0));
            out.setSinglePhase(t, p, v, h, C * ln - VL * A * (p - P0), C, VL * A, -VL * K, Phase.LIQUID);
        } else {
            final double s = CP * ln - R * Math.log(p / P0) + L0 / T0;
            out.setSinglePhase(t, p, R * t / p, CP * (t - T0) + L0, s, CP, R / p, -R * t / (p * p), Phase.VAPOUR);
        }
    }

    /** {@return Gibbs energy of the vapour less the one of the liquid} */
    private static double gibbsDifference(double t, double p) {
        return (CP - C) * (t - T0 - t * Math.log(t / T0))
                + L0 * (1 - t / T0)
                + R * t * Math.log(p / P0)
                - VL * (p - P0) * (1 + A * (t - T0) - 0.5 * K * (p - P0));
    }

    @Override
    public double pressure(double t) {
        double p = P0;
        for (int i = 0; i < 60; i++) {
            p *= Math.exp(-gibbsDifference(t, p) / (R * t - VL * p));
        }
        return p;
    }

    @Override
    public double temperature(double p) {
        double low = 200, high = 600;
        while (0.5 * (low + high) > low && 0.5 * (low + high) < high) {
            if (gibbsDifference(0.5 * (low + high), p) > 0) {
                low = 0.5 * (low + high);
            } else {
                high = 0.5 * (low + high);
            }
        }
        return high;
    }

    @Override
    public double lowestTemperature() {
        return 250;
    }

    @Override
    public double criticalTemperature() {
        return temperature(criticalPressure());
    }

    @Override
    public double criticalPressure() {
        return 10.1e5;
    }
}
