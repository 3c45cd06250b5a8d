package lostwork.plant.kernel;

/** The property functions that equations may call, named result first and arguments after it. */
public enum PropertyKind {
    /** Temperature from pressure and enthalpy. */
    TEMPERATURE_PH(2),
    /** Entropy from pressure and enthalpy. */
    ENTROPY_PH(2),
    /** Specific volume from pressure and enthalpy. */
    VOLUME_PH(2),
    /** Caloric vapour fraction from pressure and enthalpy, continued linearly outside 0 to 1. */
    VAPOUR_FRACTION_PH(2),
    /** Enthalpy from pressure and entropy. */
    ENTHALPY_PS(2),
    /** Enthalpy from pressure and temperature. */
    ENTHALPY_PT(2),
    /** Enthalpy from pressure and vapour fraction. */
    ENTHALPY_PX(2),
    /** Enthalpy from pressure and the span of temperature above saturation. */
    ENTHALPY_SUPERHEATED(2),
    /** Enthalpy from pressure and the span of temperature below saturation. */
    ENTHALPY_SUBCOOLED(2),
    /** Saturation temperature from pressure. */
    SATURATION_TEMPERATURE_P(1);

    private final int arguments;

    PropertyKind(int arguments) {
        this.arguments = arguments;
    }

    /** {@return how many arguments the function has, 1 or 2} */
    public int arguments() {
        return arguments;
    }

    /** {@return whether the function needs a fluid with a saturation line} */
    public boolean needsSaturation() {
        return switch (this) {
            case VAPOUR_FRACTION_PH, ENTHALPY_PX, ENTHALPY_SUPERHEATED, ENTHALPY_SUBCOOLED, SATURATION_TEMPERATURE_P ->
                true;
            default -> false;
        };
    }
}
