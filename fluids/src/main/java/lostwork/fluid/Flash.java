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

    static void pressureVolume(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void pressureVapourFraction(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void temperatureVapourFraction(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void temperatureEntropy(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void temperatureVolume(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void enthalpyEntropy(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void internalEnergyVolume(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void entropyVolume(FluidModel model, double first, double second, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void saturatedAtTemperature(FluidModel model, double value, PhaseSide side, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }

    static void saturatedAtPressure(FluidModel model, double value, PhaseSide side, StatePoint out) {
        throw new UnsupportedOperationException("flash engine");
    }
}
