package lostwork.fluid;

import lostwork.fluid.BracketedNewton.Outcome;

/**
 * Finds a state from two properties of which neither is temperature or pressure, by a search within a search.
 *
 * <p>Both searches run along lines on which the wanted property rises everywhere, phase boundaries included, so the root
 * is bracketed: (∂h/∂p)<sub>s</sub> = v, (∂u/∂T)<sub>v</sub> = cv, (∂s/∂T)<sub>v</sub> = cv/T. The inner search starts
 * from where the outer step expects it to end.
 */
final class PairFlash {
    private PairFlash() {}

    /** {@return where the search of (h,s) ended} */
    static Outcome enthalpyEntropy(FluidModel model, double enthalpy, double entropy, StatePoint out) {
        final FluidRange range = model.range();
        final double lowest = range.lowestPressure();
        final double highest = range.highestPressure();
        final BracketedNewton search = out.outerSearch();
        search.start(Math.log(lowest), Math.log(highest), false, false, Math.log(firstPressure(model, range)), true);
        double temperature = Double.NaN;
        boolean more;
        do {
            final double pressure = Math.min(Math.max(Math.exp(search.x), lowest), highest);
            final Outcome inner = PressureFlash.find(model, pressure, FlashProperty.ENTROPY, entropy, temperature, out);
            if (inner == Outcome.FOUND) {
                final double missing = enthalpy - out.enthalpy;
                more = search.next(
                        -missing / FlashProperty.ENTHALPY.scale(enthalpy, out), nextLogPressure(out, missing));
                // along the isentrope dT = (T_h + T_p/v) dh
                temperature = out.temperature
                        + missing * (out.temperatureByEnthalpy + out.temperatureByPressureAtEnthalpy / out.volume);
            } else if (inner == Outcome.STUCK) {
                return Outcome.STUCK;
            } else {
                more = isReachedAbove(inner, enthalpy, out) ? search.nextAbove() : search.nextBelow();
                temperature = Double.NaN;
            }
        } while (more);
        return search.outcome;
    }

    /**
     * {@return whether a higher pressure has the entropy that lies outside the range of temperatures at this one}
     *
     * <p>Along both ends of the range of temperatures entropy falls with pressure, as long as the fluid expands on heating.
     * In a liquid that contracts on heating the enthalpy tells: it rises with pressure along the isotherm and along the
     * isentrope, so a state at a lower pressure has less than the end of the range, and one at a higher pressure has more.
     * The point is at the end of the range that was met.
     */
    private static boolean isReachedAbove(Outcome outside, double enthalpy, StatePoint end) {
        return outside == Outcome.BELOW && (end.volumeByTemperature > 0 || enthalpy > end.enthalpy);
    }

    private static double nextLogPressure(StatePoint point, double missing) {
        if (point.phase == Phase.LIQUID || point.phase == Phase.TWO_PHASE) {
            return Math.log(point.pressure + missing / point.volume);
        }
        // exact for a perfect gas: ln(p2/p1) = (cp/R) ln(T2/T1)
        final double caloric = point.heatCapacity * point.temperature;
        return Math.log(point.pressure) + caloric / (point.pressure * point.volume) * Math.log1p(missing / caloric);
    }

    /** {@return where the search of (u,v) or (s,v) ended} */
    static Outcome withVolume(FluidModel model, FlashProperty property, double asked, double volume, StatePoint out) {
        final FluidRange range = model.range();
        final BracketedNewton search = out.outerSearch();
        search.start(
                range.lowestTemperature(),
                range.highestTemperature(),
                false,
                false,
                firstTemperature(model, range),
                true);
        boolean more;
        double pressure = Double.NaN;
        do {
            final Outcome inner = TemperatureFlash.find(model, search.x, FlashProperty.VOLUME, volume, pressure, out);
            if (inner == Outcome.FOUND) {
                final double missing = asked - property.of(out);
                final double isochoric = out.isochoricHeatCapacity();
                final double newton = property == FlashProperty.ENTROPY
                        // exact for a constant heat capacity
                        ? out.temperature * Math.exp(missing / isochoric)
                        : out.temperature + missing / isochoric;
                more = search.next(-missing / property.scale(asked, out), newton);
                pressure = expectedPressure(out, search.x);
            } else if (inner == Outcome.STUCK) {
                return Outcome.STUCK;
            } else {
                // Too large a volume at the lowest pressure: a hotter gas fills it. Too small a volume at the highest
                // pressure: a colder liquid fits in.
                more = inner == Outcome.BELOW ? search.nextAbove() : search.nextBelow();
                pressure = Double.NaN;
            }
        } while (more);
        return search.outcome;
    }

    /** {@return the pressure that an isochoric step to another temperature leads to; NaN where it is not a gas} */
    private static double expectedPressure(StatePoint point, double temperature) {
        if (point.phase == Phase.LIQUID || point.phase == Phase.TWO_PHASE) {
            return Double.NaN;
        }
        final double pressure =
                point.pressure - point.volumeByTemperature / point.volumeByPressure * (temperature - point.temperature);
        return pressure > 0 ? pressure : Double.NaN;
    }

    private static double firstPressure(FluidModel model, FluidRange range) {
        final SaturationModel saturation = model.saturation();
        final double usual =
                saturation == null ? 1e5 : Math.sqrt(saturation.criticalPressure() * saturation.lowestPressure());
        return Math.min(Math.max(usual, range.lowestPressure()), range.highestPressure());
    }

    private static double firstTemperature(FluidModel model, FluidRange range) {
        final SaturationModel saturation = model.saturation();
        final double usual =
                saturation == null ? 300 : 0.5 * (saturation.criticalTemperature() + saturation.lowestTemperature());
        return Math.min(Math.max(usual, range.lowestTemperature()), range.highestTemperature());
    }
}
