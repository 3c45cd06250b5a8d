package lostwork.fluid;

import java.util.Locale;

/** Tests whether the state pairs of a model return what they were asked for. */
final class FlashCheck {
    private final FluidModel model;
    private final FluidTolerance tolerance;
    private final Findings findings;
    private final StatePoint found = new StatePoint();

    FlashCheck(FluidModel model, FluidTolerance tolerance, Findings findings) {
        this.model = model;
        this.tolerance = tolerance;
        this.findings = findings;
    }

    /** Tests every pair of properties of a state. */
    void at(StatePoint asked) {
        for (final StatePair pair : StatePair.values()) {
            if (!pair.isTestedAt(asked)) {
                continue;
            }
            try {
                pair.find(model, asked, found);
            } catch (RuntimeException e) {
                findings.add(
                        FluidLaw.FLASH,
                        pair + " refused: " + e.getMessage(),
                        asked.temperature,
                        asked.pressure,
                        Double.POSITIVE_INFINITY,
                        tolerance.flashes());
                continue;
            }
            final double off = pair.deviation(asked, found);
            if (!(off <= tolerance.flashes())) {
                findings.add(
                        FluidLaw.FLASH,
                        String.format(
                                Locale.ROOT,
                                "%s returned T = %.9g K, p = %.9g Pa, h = %.9g J/kg",
                                pair,
                                found.temperature,
                                found.pressure,
                                found.enthalpy),
                        asked.temperature,
                        asked.pressure,
                        Double.isNaN(off) ? Double.POSITIVE_INFINITY : off,
                        tolerance.flashes());
            }
        }
    }
}
