package lostwork.fluid.water;

import lostwork.fluid.FlashException;

/** The one way in which a search in the equations of IAPWS-IF97 fails. */
final class If97Failure {
    private If97Failure() {}

    static FlashException of(String region, String search, int steps) {
        return new FlashException(
                "water",
                search + " (IAPWS-IF97 " + region + ")",
                Double.NaN,
                steps,
                "check the pair, or move away from the critical point");
    }
}
