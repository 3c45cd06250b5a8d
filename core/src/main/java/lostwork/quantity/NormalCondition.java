package lostwork.quantity;

/** The temperature and pressure at which a "normal" or "standard" gas volume is counted. */
public enum NormalCondition {
    /** 0 °C and 101.325 kPa (DIN 1343). */
    DIN_1343(273.15),
    /** 15 °C and 101.325 kPa (ISO 13443). */
    ISO_13443(288.15);

    /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
    private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

    private static final double PRESSURE_PA = 101325;

    private final double temperatureK;

    NormalCondition(double temperatureK) {
        this.temperatureK = temperatureK;
    }

    /** {@return the temperature} */
    public Temperature temperature() {
        return Temperature.kelvin(temperatureK);
    }

    /** {@return the absolute pressure} */
    public Pressure pressure() {
        return Pressure.pascal(PRESSURE_PA);
    }

    /** {@return the volume of one mole of an ideal gas at this condition} */
    public MolarVolume molarVolume() {
        return MolarVolume.cubicMetresPerMole(MOLAR_GAS_CONSTANT * temperatureK / PRESSURE_PA);
    }
}
