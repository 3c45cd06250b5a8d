package lostwork.fluid;

/** Finds states from other pairs than temperature and pressure, for models that bring no inverse of their own. */
final class Flash {
    private Flash() {}

    static void temperaturePressure(FluidModel model, double temperature, double pressure, StatePoint out) {
        final SaturationModel saturation = model.saturation();
        final boolean liquid = saturation != null
                && temperature < saturation.criticalTemperature()
                && temperature >= saturation.lowestTemperature()
                && pressure >= saturation.pressure(temperature);
        model.evaluate(temperature, pressure, liquid ? PhaseSide.LIQUID : PhaseSide.VAPOUR, out);
    }

    static void pressureEnthalpy(FluidModel model, double pressure, double enthalpy, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void pressureEntropy(FluidModel model, double pressure, double entropy, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }
}
