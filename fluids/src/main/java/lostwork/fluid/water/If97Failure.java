package lostwork.fluid.water;

import lostwork.fluid.FlashException;
import lostwork.quantity.OutOfRangeException;

/** What the equations of IAPWS-IF97 refuse, and how a search in them fails. */
final class If97Failure {
    static final String SOURCE = "IAPWS-IF97";
    private static final String WAY_OUT = "no extrapolation is offered; take a state inside the range";

    private If97Failure() {}

    static FlashException of(String region, String search, double residual) {
        return new FlashException(
                "water",
                search + " (" + SOURCE + " " + region + ")",
                residual,
                If97Region3.STEPS,
                "check the pair, or move away from the critical point");
    }

    static OutOfRangeException outside(
            String quantity, double value, double lowest, double highest, String unit, String where) {
        return new OutOfRangeException(
                quantity, value, lowest, highest, unit, where.isEmpty() ? SOURCE : SOURCE + " " + where, WAY_OUT);
    }
}
