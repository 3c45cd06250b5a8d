package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Variable;
import lostwork.quantity.Ratio;

/** What generator, motor and shaft have in common: power in, less power out, the difference leaves as heat. */
final class PowerLoss {
    private PowerLoss() {}

    /**
     * States the efficiency, the energy balance, that there are no losses unless something else is given, and the limits of
     * the efficiency.
     *
     * @param e takes the equations
     * @param efficiency power out over power in; its name names the equation
     * @param words the efficiency in words with its article, for the limits
     * @param taken the power that enters
     * @param delivered the power that leaves
     * @param loss where the difference leaves
     */
    static void describe(
            Equations e,
            Variable<Ratio> efficiency,
            String words,
            Expression taken,
            Expression delivered,
            HeatOutlet loss) {
        e.model(efficiency.name(), delivered, efficiency.times(taken));
        e.law("energy balance", loss.rate(), taken.minus(delivered));
        e.assume("no losses", efficiency, Ratio.percent(100));
        e.require(words + " above 0 %", efficiency);
        e.require(words + " of at most 100 %", Expression.number(1).minus(efficiency));
    }
}
