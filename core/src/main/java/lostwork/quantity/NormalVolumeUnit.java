package lostwork.quantity;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The marks N and S of volume flows that are counted at a normal condition, such as Nm³/h. */
final class NormalVolumeUnit {
    private static final List<String> FLOWS = List.of("m³/s", "m³/h", "m³/hr");

    private NormalVolumeUnit() {}

    /** {@return advice for the spellings of normal volume flows, which no kind has as a unit of its own} */
    static Map<String, String> hints() {
        final Map<String, String> hints = new HashMap<>();
        for (String flow : FLOWS) {
            hints.put("N" + flow, advice("DIN_1343"));
            hints.put("S" + flow, advice("ISO_13443"));
        }
        return hints;
    }

    private static String advice(String constant) {
        return "a normal volume is an amount of gas: use MolarFlow.parse(text, NormalCondition." + constant
                + ") if that is the condition it was counted at";
    }

    /**
     * {@return the unit of a volume flow that is marked as counted at a condition, or null if there is no mark}
     *
     * @param text the whole text, for the message
     * @param symbol the symbol, such as {@code "Nm³/h"}
     * @param condition the condition that is stated beside the text
     * @throws UnreadableQuantityException if the mark is that of another condition
     */
    static @Nullable Unit<VolumeFlow> find(String text, String symbol, NormalCondition condition) {
        final String key = UnitSymbol.key(symbol);
        for (String flow : FLOWS) {
            final boolean normal = UnitSymbol.key("N" + flow).equals(key);
            final boolean standard = UnitSymbol.key("S" + flow).equals(key);
            if (normal && condition.equals(NormalCondition.ISO_13443)
                    || standard && condition.equals(NormalCondition.DIN_1343)) {
                throw QuantityText.refusal(
                        text,
                        MolarFlow.KIND,
                        symbol + " is not the mark of the condition that was stated, " + condition);
            }
            if (normal || standard) {
                return VolumeFlow.KIND.unit(flow);
            }
        }
        return null;
    }
}
