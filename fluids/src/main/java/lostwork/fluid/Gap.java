package lostwork.fluid;

import lostwork.fluid.BracketedNewton.Outcome;

/**
 * What happens when a property jumps over the value asked for.
 *
 * <p>Formulations made of several equations have small jumps where the regions meet (1e-5 of the enthalpy in some steam
 * formulations). A value inside such a jump belongs to no state. Between the two neighbours the properties are then
 * interpolated, as between two phases, so that the value asked for is returned and a solver can pass; the derivatives
 * are those of the upper neighbour. A larger jump is a failure.
 */
final class Gap {
    /** The largest relative jump that is bridged. */
    private static final double LARGEST = 1e-3;

    private Gap() {}

    /** {@return whether the gap between the two work areas was bridged} */
    static Outcome bridge(FlashProperty property, double asked, StatePoint out) {
        final StatePoint below = out.liquidSide();
        final StatePoint above = out.vapourSide();
        final double from = property.of(below);
        final double to = property.of(above);
        final double share = (asked - from) / (to - from);
        if (!(share >= 0 && share <= 1 && Math.abs(to - from) <= LARGEST * property.scale(asked, above))) {
            return Outcome.STUCK;
        }
        out.set(above);
        out.volume = below.volume + share * (above.volume - below.volume);
        out.enthalpy = below.enthalpy + share * (above.enthalpy - below.enthalpy);
        out.entropy = below.entropy + share * (above.entropy - below.entropy);
        return Outcome.FOUND;
    }
}
