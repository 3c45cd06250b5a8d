package lostwork.fluid;

/** A property that a flash looks for, with its derivative and the scale that its distance is judged on. */
enum FlashProperty {
    ENTHALPY("specific enthalpy", "h", "J/kg"),
    ENTROPY("specific entropy", "s", "J/(kg K)"),
    VOLUME("specific volume", "v", "m³/kg"),
    INTERNAL_ENERGY("specific internal energy", "u", "J/kg");

    private final String words;
    private final String symbol;
    private final String unit;

    FlashProperty(String words, String symbol, String unit) {
        this.words = words;
        this.symbol = symbol;
        this.unit = unit;
    }

    /** {@return the name in words} */
    String words() {
        return words;
    }

    /** {@return the SI unit} */
    String unit() {
        return unit;
    }

    /** {@return symbol, value and unit in words} */
    String with(double value) {
        return symbol + " = " + value + " " + unit;
    }

    double of(StatePoint point) {
        return switch (this) {
            case ENTHALPY -> point.enthalpy;
            case ENTROPY -> point.entropy;
            case VOLUME -> point.volume;
            case INTERNAL_ENERGY -> point.internalEnergy();
        };
    }

    /** {@return the derivative with temperature at constant pressure, in one phase} */
    double byTemperature(StatePoint point) {
        return switch (this) {
            case ENTHALPY -> point.heatCapacity;
            case ENTROPY -> point.heatCapacity / point.temperature;
            case VOLUME -> point.volumeByTemperature;
            case INTERNAL_ENERGY -> point.heatCapacity - point.pressure * point.volumeByTemperature;
        };
    }

    /**
     * {@return the scale on which a distance from the value asked for is judged}
     *
     * <p>Energies and entropies have an arbitrary zero, so close to it the distance is judged on the natural scale of the
     * fluid instead of on the value.
     */
    double scale(double asked, StatePoint point) {
        final double heatCapacity = naturalHeatCapacity(point);
        return switch (this) {
            case ENTHALPY, INTERNAL_ENERGY -> Math.max(Math.abs(asked), heatCapacity * point.temperature);
            case ENTROPY -> Math.max(Math.abs(asked), heatCapacity);
            case VOLUME -> asked;
        };
    }

    /** {@return a heat capacity that stays finite at the critical point, where cp does not} */
    private static double naturalHeatCapacity(StatePoint point) {
        return point.phase == Phase.TWO_PHASE
                ? point.pressure * point.volume / point.temperature
                : point.isochoricHeatCapacity();
    }
}
