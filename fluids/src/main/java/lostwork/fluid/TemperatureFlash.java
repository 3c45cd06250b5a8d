package lostwork.fluid;

import lostwork.fluid.BracketedNewton.Outcome;
import org.jspecify.annotations.Nullable;

/**
 * Finds a state at a temperature and one more property, volume or entropy, by searching the pressure.
 *
 * <p>Below the critical temperature the two saturated states decide whether the state is liquid, two-phase or vapour. In
 * one phase the volume falls with pressure (mechanical stability), so the root is the only one. Entropy falls where the
 * fluid expands on heating, (∂s/∂p)<sub>T</sub> = −(∂v/∂T)<sub>p</sub>; where it contracts, the root at the lower
 * pressure is taken.
 */
final class TemperatureFlash {
    private TemperatureFlash() {}

    /**
     * {@return where the search ended: BELOW means that the pressure would lie below the range, ABOVE that it would lie
     * above}
     *
     * @param guess a pressure to start from; NaN where there is none
     */
    static Outcome find(
            FluidModel model, double temperature, FlashProperty property, double asked, double guess, StatePoint out) {
        final double lowest = model.lowestPressureAt(temperature);
        final double highest = model.highestPressureAt(temperature);
        final SaturationModel saturation = model.saturation();
        if (saturation == null
                || temperature >= saturation.criticalTemperature()
                || temperature < saturation.lowestTemperature()) {
            final double first = Double.isNaN(guess) ? firstPressure(saturation, lowest, highest) : guess;
            return searchGas(model, temperature, property, asked, lowest, highest, false, false, first, out);
        }
        final double boiling = saturation.pressure(temperature);
        if (boiling > highest) {
            // The saturation line has left the range: every state of this temperature is a vapour.
            final double first = Double.isNaN(guess) ? highest : Math.min(guess, highest);
            return searchGas(model, temperature, property, asked, lowest, highest, false, false, first, out);
        }
        final StatePoint liquid = out.liquidSide();
        model.evaluate(temperature, boiling, PhaseSide.LIQUID, liquid);
        final double ofLiquid = property.of(liquid);
        if (asked < ofLiquid) {
            final double first = Double.isNaN(guess) ? boiling : guess;
            return searchLiquid(model, temperature, property, asked, boiling, highest, first, out);
        }
        final StatePoint vapour = out.vapourSide();
        model.evaluate(temperature, boiling, PhaseSide.VAPOUR, vapour);
        final double ofVapour = property.of(vapour);
        if (asked > ofVapour) {
            final double first = Double.isNaN(guess) ? boiling : guess;
            return searchGas(model, temperature, property, asked, lowest, boiling, false, true, first, out);
        }
        out.setTwoPhase(
                liquid,
                vapour,
                (asked - ofLiquid) / (ofVapour - ofLiquid),
                saturation.pressureByTemperature(temperature));
        return Outcome.FOUND;
    }

    private static double firstPressure(@Nullable SaturationModel saturation, double lowest, double highest) {
        final double usual = saturation == null ? 1e5 : saturation.criticalPressure();
        return Math.min(Math.max(usual, lowest), highest);
    }

    /** Searches the logarithm of pressure: a gas has nearly straight lines over it. */
    private static Outcome searchGas(
            FluidModel model,
            double temperature,
            FlashProperty property,
            double asked,
            double lowest,
            double highest,
            boolean lowTested,
            boolean highTested,
            double guess,
            StatePoint out) {
        final BracketedNewton search = out.innerSearch();
        search.start(Math.log(lowest), Math.log(highest), lowTested, highTested, Math.log(guess), false);
        boolean more;
        do {
            final double pressure = pressure(search.x, lowest, highest);
            model.evaluate(temperature, pressure, PhaseSide.VAPOUR, out);
            if (property == FlashProperty.VOLUME) {
                final double byLog = pressure * out.volumeByPressure / out.volume;
                more = search.next((out.volume - asked) / asked, search.x - Math.log(out.volume / asked) / byLog);
            } else {
                final double difference = out.entropy - asked;
                more = search.next(
                        difference / property.scale(asked, out),
                        search.x + difference / (pressure * out.volumeByTemperature));
            }
        } while (more);
        if (search.outcome == Outcome.STUCK) {
            final double lower = pressure(search.low, lowest, highest);
            final double upper = pressure(search.high, lowest, highest);
            model.evaluate(temperature, lower, PhaseSide.VAPOUR, out.liquidSide());
            model.evaluate(temperature, upper, PhaseSide.VAPOUR, out.vapourSide());
            return Gap.bridge(property, asked, out);
        }
        return search.outcome;
    }

    private static double pressure(double logarithm, double lowest, double highest) {
        return Math.min(Math.max(Math.exp(logarithm), lowest), highest);
    }

    /** Searches the pressure itself: a liquid has nearly straight lines over it. */
    private static Outcome searchLiquid(
            FluidModel model,
            double temperature,
            FlashProperty property,
            double asked,
            double lowest,
            double highest,
            double guess,
            StatePoint out) {
        final BracketedNewton search = out.innerSearch();
        search.start(lowest, highest, true, false, guess, false);
        boolean more;
        do {
            model.evaluate(temperature, search.x, PhaseSide.LIQUID, out);
            final double difference = property.of(out) - asked;
            final double slope = property == FlashProperty.VOLUME ? out.volumeByPressure : -out.volumeByTemperature;
            more = search.next(difference / property.scale(asked, out), search.x - difference / slope);
        } while (more);
        if (search.outcome == Outcome.STUCK) {
            model.evaluate(temperature, search.low, PhaseSide.LIQUID, out.liquidSide());
            model.evaluate(temperature, search.high, PhaseSide.LIQUID, out.vapourSide());
            return Gap.bridge(property, asked, out);
        }
        return search.outcome;
    }
}
