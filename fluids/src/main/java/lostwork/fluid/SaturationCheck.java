package lostwork.fluid;

/** Tests the saturation line and the flashes within the two-phase region. */
final class SaturationCheck {
    private static final int PLACES = 60;
    private static final double STEP = 1e-4;
    /** Stays away from the critical point, where all differences vanish. */
    private static final double HIGHEST_REDUCED_TEMPERATURE = 0.98;

    private final FluidModel model;
    private final FluidTolerance tolerance;
    private final Findings findings;
    private final FlashCheck flashes;
    private final StatePoint liquid = new StatePoint();
    private final StatePoint vapour = new StatePoint();
    private final StatePoint mixed = new StatePoint();

    SaturationCheck(FluidModel model, FluidTolerance tolerance, Findings findings) {
        this.model = model;
        this.tolerance = tolerance;
        this.findings = findings;
        flashes = new FlashCheck(model, tolerance, findings);
    }

    /** {@return the number of places} */
    int run() {
        final SaturationModel saturation = model.saturation();
        if (saturation == null) {
            return 0;
        }
        final double lowest = saturation.lowestTemperature();
        final double highest = HIGHEST_REDUCED_TEMPERATURE * saturation.criticalTemperature();
        int places = 0;
        for (int i = 0; i < PLACES; i++) {
            final double temperature = lowest + (i + 0.5) / PLACES * (highest - lowest);
            final double pressure = saturation.pressure(temperature);
            if (model.range().contains(temperature, pressure)) {
                places++;
                at(saturation, temperature, pressure, (i % 9 + 0.5) / 9);
            }
        }
        return places;
    }

    private void at(SaturationModel saturation, double temperature, double pressure, double fraction) {
        findings.compare(
                FluidLaw.SATURATION_INVERSE,
                "T(p(T))",
                temperature,
                pressure,
                saturation.temperature(pressure),
                temperature,
                temperature,
                Math.min(tolerance.saturation(), 1e-6));
        model.evaluate(temperature, pressure, PhaseSide.LIQUID, liquid);
        model.evaluate(temperature, pressure, PhaseSide.VAPOUR, vapour);
        final double latent = vapour.enthalpy - liquid.enthalpy;
        findings.compare(
                FluidLaw.EQUAL_GIBBS_ENERGY,
                "T (s'' - s')",
                temperature,
                pressure,
                temperature * (vapour.entropy - liquid.entropy),
                latent,
                latent,
                tolerance.saturation());
        final double step = STEP * temperature;
        final double wide =
                (saturation.pressure(temperature + step) - saturation.pressure(temperature - step)) / (2 * step);
        final double narrow =
                (saturation.pressure(temperature + 0.5 * step) - saturation.pressure(temperature - 0.5 * step)) / step;
        final double slope = (4 * narrow - wide) / 3;
        final double rounding = 16 * Math.ulp(pressure) / step / slope;
        findings.compare(
                FluidLaw.CLAUSIUS_CLAPEYRON,
                "(h'' - h')/(T (v'' - v')) in Pa/K",
                temperature,
                pressure,
                latent / (temperature * (vapour.volume - liquid.volume)),
                slope,
                slope,
                tolerance.saturation() + rounding);
        final double stated = saturation.pressureByTemperature(temperature);
        if (!Double.isNaN(stated)) {
            findings.compare(
                    FluidLaw.SATURATION_SLOPE,
                    "the stated dp/dT in Pa/K",
                    temperature,
                    pressure,
                    stated,
                    slope,
                    slope,
                    tolerance.derivatives() + rounding);
        }
        mixed.setTwoPhase(liquid, vapour, fraction);
        flashes.at(mixed);
    }
}
