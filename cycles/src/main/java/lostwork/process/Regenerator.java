package lostwork.process;

import lostwork.fluid.FluidState;
import lostwork.process.ProcessException.Reason;
import lostwork.quantity.SpecificEnergy;

/** An ideal regenerator between two steps of a cycle. */
final class Regenerator {
    private static final int LOOKS = 32;

    /** Flashes return temperatures to about 1e-9. */
    private static final double SAME_TEMPERATURE = 1e-8;

    private Regenerator() {}

    /** {@return the heat per mass that both steps have in common, in J/kg} */
    static double keptJoulesPerKilogram(ProcessStep giving, ProcessStep receiving) {
        final double given = -giving.specificHeat().si();
        final double received = receiving.specificHeat().si();
        if (!(given > 0 && received > 0)) {
            throw new ProcessException(
                    Reason.DIRECTION,
                    "a regenerator needs a step that gives heat off and one that takes heat in; " + giving + " has "
                            + giving.specificHeat() + " and " + receiving + " has " + receiving.specificHeat());
        }
        final double kept = Math.min(given, received);
        for (int i = 0; i <= LOOKS; i++) {
            final double position = kept * i / LOOKS; // heat stored between here and the cold end
            final double hotSide =
                    afterHeat(giving, position - kept).temperature().si();
            final double coldSide = afterHeat(receiving, position).temperature().si();
            if (!(hotSide >= coldSide * (1 - SAME_TEMPERATURE))) {
                throw new ProcessException(
                        Reason.HEAT_UPHILL,
                        "the regenerator would have to lift heat from " + hotSide + " K of the " + giving + " to "
                                + coldSide + " K of the " + receiving + "; choose steps whose temperatures overlap");
            }
        }
        return kept;
    }

    private static FluidState afterHeat(ProcessStep step, double joulesPerKilogram) {
        final FluidState from = step.from();
        final SpecificEnergy heat = SpecificEnergy.joulesPerKilogram(joulesPerKilogram);
        return switch (step.kind()) {
            case ISOCHORIC -> from.fluid().state(from.internalEnergy().plus(heat), from.volume());
            case ISOBARIC -> from.fluid().state(from.pressure(), from.enthalpy().plus(heat));
            default ->
                throw new ProcessException(
                        Reason.DIRECTION, "a regenerator works on isochoric and isobaric steps, not on the " + step);
        };
    }
}
