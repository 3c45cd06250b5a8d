package lostwork.quantity;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** The marks that turn a unit of absolute pressure into that of a gauge reading, such as bar(g), psig, kPa gauge. */
final class GaugeUnit {
    private static final List<String> MARKS =
            List.of("g", " g", "_g", "(g)", " (g)", " gauge", "(gauge)", " (gauge)", "ü", " ü");

    private static final String ADVICE =
            "a gauge pressure needs the atmosphere that it is counted from: use Pressure.parse(text, atmosphere)";

    private GaugeUnit() {}

    /** {@return the advice to state an atmosphere, for every gauge spelling of some units} */
    static Map<String, String> hints(List<Unit<Pressure>> units) {
        final Map<String, String> hints = new HashMap<>();
        for (Unit<Pressure> unit : units) {
            for (String mark : MARKS) {
                hints.put(unit.symbol() + mark, ADVICE);
            }
        }
        return hints;
    }

    /** {@return the unit that a gauge symbol counts in, or null if the symbol is no gauge unit} */
    static @Nullable Unit<Pressure> find(String symbol) {
        final String key = UnitSymbol.key(symbol);
        for (Unit<Pressure> unit : Pressure.KIND.units()) {
            for (String mark : MARKS) {
                if (UnitSymbol.key(unit.symbol() + mark).equals(key)) {
                    return unit;
                }
            }
        }
        return null;
    }
}
