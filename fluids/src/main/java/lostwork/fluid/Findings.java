package lostwork.fluid;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Collects what a check finds and keeps the worst place of each law. */
final class Findings {
    private final Map<FluidLaw, FluidFinding> worst = new EnumMap<>(FluidLaw.class);

    /** Compares two numbers on a scale. */
    void compare(
            FluidLaw law,
            String what,
            double temperature,
            double pressure,
            double stated,
            double expected,
            double scale,
            double allowed) {
        final double deviation = Math.abs(stated - expected) / scale;
        if (!(deviation <= allowed)) {
            add(
                    law,
                    String.format(Locale.ROOT, "%s is %.9g, expected %.9g", what, stated, expected),
                    temperature,
                    pressure,
                    Double.isNaN(deviation) ? Double.POSITIVE_INFINITY : deviation,
                    allowed);
        }
    }

    /** Notes that a law is broken. */
    void add(FluidLaw law, String detail, double temperature, double pressure, double deviation, double allowed) {
        final FluidFinding before = worst.get(law);
        final int places = before == null ? 1 : before.places() + 1;
        worst.put(
                law,
                before == null || deviation > before.deviation()
                        ? new FluidFinding(law, detail, temperature, pressure, deviation, allowed, places)
                        : new FluidFinding(
                                law,
                                before.detail(),
                                before.temperature(),
                                before.pressure(),
                                before.deviation(),
                                before.allowed(),
                                places));
    }

    List<FluidFinding> list() {
        return List.copyOf(new ArrayList<>(worst.values()));
    }
}
