package lostwork.quantity;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The temperature and pressure at which a "normal" or "standard" gas volume is counted. */
public enum NormalCondition {
    /** 0 °C and 101.325 kPa (DIN 1343), often marked Nm³. */
    DIN_1343(273.15, 'N'),
    /** 15 °C and 101.325 kPa (ISO 13443), often marked Sm³. */
    ISO_13443(288.15, 'S');

    /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
    private static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

    private static final double PRESSURE_PA = 101325;

    private static final List<String> FLOWS = List.of("m³/s", "m³/h", "m³/hr");

    private final double temperatureK;
    private final char mark;

    NormalCondition(double temperatureK, char mark) {
        this.temperatureK = temperatureK;
        this.mark = mark;
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

    /** {@return advice for the spellings of normal volume flows, which no kind has as a unit of its own} */
    static Map<String, String> hints() {
        final Map<String, String> hints = new HashMap<>();
        for (NormalCondition condition : values()) {
            for (String flow : FLOWS) {
                hints.put(
                        condition.mark + flow,
                        "a normal volume is an amount of gas: use MolarFlow.parse(text, NormalCondition." + condition
                                + ")");
            }
        }
        return hints;
    }

    /**
     * {@return the unit of a volume flow that is marked as counted at this condition, or null if there is no mark}
     *
     * @param text the whole text, for the message
     * @param symbol the symbol, such as {@code "Nm³/h"}
     * @throws UnreadableQuantityException if the mark is that of another condition
     */
    @Nullable
    Unit<VolumeFlow> unit(String text, String symbol) {
        final String key = UnitSymbol.key(symbol);
        for (NormalCondition condition : values()) {
            for (String flow : FLOWS) {
                if (UnitSymbol.key(condition.mark + flow).equals(key)) {
                    if (condition != this) {
                        throw QuantityText.refusal(
                                text,
                                MolarFlow.KIND,
                                condition.mark + "m³ marks a volume at " + condition + ", but " + this + " was stated");
                    }
                    return VolumeFlow.KIND.unit(flow);
                }
            }
        }
        return null;
    }
}
