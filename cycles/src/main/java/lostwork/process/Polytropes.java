package lostwork.process;

import lostwork.fluid.FluidState;
import lostwork.process.ProcessException.Reason;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import lostwork.solve.BracketedRoot;

/** Ends of polytropic steps, {@code p vⁿ = const}. */
final class Polytropes {
    /** How many steps look for the end temperature; the ideal gas would need {@value #IDEAL_STEPS} of them. */
    private static final int LOOKS = 64;

    private static final int IDEAL_STEPS = 16;

    /** A larger exponent needs volumes that differ by less than the searches for states resolve. */
    private static final double LARGEST = 1e6;

    private static final BracketedRoot ROOT = BracketedRoot.limitedTo(100).withAbsoluteAccuracy(1e-14);

    private Polytropes() {}

    static void requireExponent(double exponent) {
        if (!(Math.abs(exponent) <= LARGEST)) {
            throw new ProcessException(
                    Reason.EXPONENT,
                    "polytropic exponent = " + exponent
                            + " must be a number from -1e6 to 1e6; for constant volume take an" + " isochoric step");
        }
    }

    static FluidState endAtVolume(FluidState from, double exponent, SpecificVolume volume) {
        return at(from, exponent, Math.log(volume.si() / from.volume().si()));
    }

    static FluidState endAtPressure(FluidState from, double exponent, Pressure pressure) {
        if (exponent == 0 && pressure.si() != from.pressure().si()) {
            throw new ProcessException(
                    Reason.EXPONENT,
                    "a polytropic step with the exponent 0 stays at " + from.pressure() + " and does not reach "
                            + pressure + "; give another exponent or the volume");
        }
        final double logVolumeRatio =
                exponent == 0 ? 0 : Math.log(from.pressure().si() / pressure.si()) / exponent;
        return from.fluid()
                .state(
                        pressure,
                        SpecificVolume.cubicMetresPerKilogram(from.volume().si() * Math.exp(logVolumeRatio)));
    }

    private static FluidState at(FluidState from, double exponent, double logVolumeRatio) {
        return from.fluid()
                .state(
                        Pressure.pascal(from.pressure().si() * Math.exp(-exponent * logVolumeRatio)),
                        SpecificVolume.cubicMetresPerKilogram(from.volume().si() * Math.exp(logVolumeRatio)));
    }

    static FluidState endAtTemperature(FluidState from, double exponent, Temperature temperature) {
        // For an ideal gas T v^(n−1) is constant; a real one is searched the same way, and beyond.
        final double ideal = Math.log(temperature.si() / from.temperature().si()) / (1 - exponent);
        if (ideal == 0) {
            return from;
        }
        if (!(Math.abs(ideal) <= Double.MAX_VALUE)) {
            throw new ProcessException(
                    Reason.EXPONENT,
                    "a polytropic step with the exponent 1 is isothermal for an ideal gas and does not tell where it reaches "
                            + temperature + "; give the pressure or the volume");
        }
        double before = 0;
        double missingBefore = from.temperature().si() - temperature.si();
        for (int i = 1; i <= LOOKS; i++) {
            final double here = ideal * i / IDEAL_STEPS;
            final double missing = at(from, exponent, here).temperature().si() - temperature.si();
            if (Math.abs(missing) <= 1e-13 * temperature.si()) {
                return at(from, exponent, here);
            }
            if (missing > 0 != missingBefore > 0) {
                final double root = ROOT.solve(
                        "polytropic step to " + temperature,
                        x -> at(from, exponent, x).temperature().si() - temperature.si(),
                        Math.min(before, here),
                        Math.max(before, here));
                return at(from, exponent, root);
            }
            before = here;
            missingBefore = missing;
        }
        throw new ProcessException(
                Reason.END_NOT_REACHED,
                "the polytropic path from " + OpenChainException.point(from) + " with the exponent " + exponent
                        + " does not reach " + temperature + " within a volume ratio of "
                        + Math.exp(Math.abs(ideal) * LOOKS / IDEAL_STEPS) + "; give the pressure or the volume");
    }

    static double exponentBetween(FluidState from, FluidState to) {
        final double exponent = Math.log(from.pressure().si() / to.pressure().si())
                / Math.log(to.volume().si() / from.volume().si());
        if (!(Math.abs(exponent) <= LARGEST)) {
            throw new ProcessException(
                    Reason.EXPONENT,
                    "no polytropic exponent within -1e6 to 1e6 leads from " + OpenChainException.point(from) + " to "
                            + OpenChainException.point(to) + ", which have the same volume; take an isochoric step");
        }
        return exponent;
    }
}
