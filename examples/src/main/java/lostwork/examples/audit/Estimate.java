package lostwork.examples.audit;

import lostwork.quantity.Power;

/**
 * A power and how far it may be off.
 *
 * @param value the power
 * @param uncertainty expanded uncertainty, with the coverage of the instruments' figures in the survey
 */
record Estimate(Power value, Power uncertainty) {
    static final Estimate ZERO = new Estimate(Power.watts(0), Power.watts(0));

    /** {@return the lower end of the range, not below zero} */
    Power low() {
        return Power.watts(Math.max(0, value.si() - uncertainty.si()));
    }

    /** {@return the upper end of the range} */
    Power high() {
        return value.plus(uncertainty);
    }
}
