package lostwork.fluid;

import lostwork.fluid.BracketedNewton.Outcome;

/**
 * Finds a state at a pressure and one more property, by searching the temperature.
 *
 * <p>Below the critical pressure the two saturated states decide whether the state is liquid, two-phase or vapour; in the
 * two-phase region the lever rule is exact. In one phase enthalpy and entropy rise with temperature, since cp is above 0,
 * so the root is the only one. Volume rises too but in a liquid that contracts on heating; there the branch above the
 * temperature of the least volume is taken.
 */
final class PressureFlash {
    /** For a range of temperatures without liquid. */
    private static final double NO_LIQUID = 0;
    /** For a range of temperatures that is all liquid. */
    private static final double ALL_LIQUID = Double.POSITIVE_INFINITY;

    private PressureFlash() {}

    /**
     * {@return where the search ended: BELOW and ABOVE mean that the property lies outside what the range allows}
     *
     * @param guess a temperature to start from; NaN where there is none
     */
    static Outcome find(
            FluidModel model, double pressure, FlashProperty property, double asked, double guess, StatePoint out) {
        final BracketedNewton search = out.innerSearch();
        final double lowest = model.lowestTemperatureAt(pressure);
        final double highest = model.highestTemperatureAt(pressure);
        final SaturationModel saturation = model.saturation();
        if (saturation == null || pressure < saturation.lowestPressure()) {
            search.start(lowest, highest, false, false, guess, true);
            return search(model, pressure, property, asked, NO_LIQUID, search, out);
        }
        if (pressure >= saturation.criticalPressure()) {
            final double critical = saturation.criticalTemperature();
            search.start(lowest, highest, false, false, Double.isNaN(guess) ? critical : guess, true);
            return search(model, pressure, property, asked, critical, search, out);
        }
        final double boiling = saturation.temperature(pressure);
        final StatePoint liquid = out.liquidSide();
        model.evaluate(boiling, pressure, PhaseSide.LIQUID, liquid);
        final double ofLiquid = property.of(liquid);
        if (asked < ofLiquid) {
            search.start(lowest, boiling, false, true, start(property, asked, ofLiquid, liquid, guess), true);
            return search(model, pressure, property, asked, ALL_LIQUID, search, out);
        }
        final StatePoint vapour = out.vapourSide();
        model.evaluate(boiling, pressure, PhaseSide.VAPOUR, vapour);
        final double ofVapour = property.of(vapour);
        if (asked > ofVapour) {
            search.start(boiling, highest, true, false, start(property, asked, ofVapour, vapour, guess), true);
            return search(model, pressure, property, asked, NO_LIQUID, search, out);
        }
        out.setTwoPhase(
                liquid, vapour, (asked - ofLiquid) / (ofVapour - ofLiquid), saturation.pressureByTemperature(boiling));
        return Outcome.FOUND;
    }

    private static double start(
            FlashProperty property, double asked, double atSaturation, StatePoint saturated, double guess) {
        return Double.isNaN(guess)
                ? saturated.temperature + (asked - atSaturation) / property.byTemperature(saturated)
                : guess;
    }

    /** Searches a range of temperatures without a phase change; below the given one the liquid side is meant. */
    private static Outcome search(
            FluidModel model,
            double pressure,
            FlashProperty property,
            double asked,
            double liquidBelow,
            BracketedNewton search,
            StatePoint out) {
        if (property == FlashProperty.VOLUME && liquidBelow > search.low) {
            startAboveLeastVolume(model, pressure, liquidBelow, search, out);
        }
        boolean more;
        do {
            final double temperature = search.x;
            model.evaluate(temperature, pressure, side(temperature, liquidBelow), out);
            final double difference = property.of(out) - asked;
            final double slope = property.byTemperature(out);
            more = search.next(difference / property.scale(asked, out), temperature - difference / slope);
        } while (more);
        if (search.outcome == Outcome.STUCK) {
            model.evaluate(search.low, pressure, side(search.low, liquidBelow), out.liquidSide());
            model.evaluate(search.high, pressure, side(search.high, liquidBelow), out.vapourSide());
            return Gap.bridge(property, asked, out);
        }
        return search.outcome;
    }

    /** Raises the lower end of the search to the temperature of the least volume, where the liquid has one. */
    private static void startAboveLeastVolume(
            FluidModel model, double pressure, double liquidBelow, BracketedNewton search, StatePoint out) {
        double contracting = search.low;
        double expanding = search.high;
        model.evaluate(contracting, pressure, side(contracting, liquidBelow), out);
        if (!(out.volumeByTemperature < 0)) {
            return;
        }
        double middle = 0.5 * (contracting + expanding);
        while (middle > contracting && middle < expanding) {
            model.evaluate(middle, pressure, side(middle, liquidBelow), out);
            if (out.volumeByTemperature < 0) {
                contracting = middle;
            } else {
                expanding = middle;
            }
            middle = 0.5 * (contracting + expanding);
        }
        search.raise(expanding);
    }

    private static PhaseSide side(double temperature, double liquidBelow) {
        return temperature < liquidBelow ? PhaseSide.LIQUID : PhaseSide.VAPOUR;
    }
}
