package lostwork.process;

import lostwork.fluid.FluidState;
import lostwork.quantity.Mass;
import lostwork.quantity.SpecificEntropy;
import lostwork.solve.ConvergenceException;

/** Finds the end of an isothermal step from its heat. */
final class IsothermalHeating {
    private static final int LIMIT = 40;

    private static final double ACCURACY = 1e-11;

    private IsothermalHeating() {}

    /**
     * {@return the state at the end}
     *
     * <p>In a consistent property model the first point, {@code Δs = q/T}, is the answer. Where the model has a fitting error
     * between its parts, the heat of the energy balance differs from {@code T Δs} by that error; then the difference is added
     * until the balance gives the heat asked for. Each pass reduces the difference by the relative size of the fitting error.
     *
     * @param from the state at the start
     * @param heat the heat per mass in J/kg
     */
    static FluidState end(FluidState from, double heat) {
        final double kelvin = from.temperature().si();
        final double scale = Math.abs(heat)
                + Math.abs(from.internalEnergy().si())
                + from.pressure().si() * from.volume().si();
        double entropy = from.entropy().si() + heat / kelvin;
        double missing = Double.NaN;
        for (int i = 0; i < LIMIT; i++) {
            final FluidState to =
                    from.fluid().state(from.temperature(), SpecificEntropy.joulesPerKilogramKelvin(entropy));
            final ProcessStep step =
                    ProcessStep.between(ProcessKind.ISOTHERMAL, Double.NaN, Mass.kilograms(1), from, to);
            missing = heat - step.specificHeat().si();
            if (Math.abs(missing) <= ACCURACY * scale) {
                return to;
            }
            entropy += missing / kelvin;
        }
        throw new ConvergenceException(
                "end of an isothermal step from its heat",
                LIMIT,
                entropy,
                missing,
                "the heat of the energy balance does not follow T ds",
                "check the property model with FluidCheck, or give the end by its volume");
    }
}
