package lostwork.ledger;

import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.SpecificEnergy;

/**
 * The physical exergy of one stream.
 *
 * @param from the port where the stream leaves a component
 * @param to the port where it enters the next one
 * @param flow the mass flow
 * @param thermal the specific exergy due to the temperature
 * @param mechanical the specific exergy due to the pressure, negative below ambient pressure
 */
public record StreamExergy(String from, String to, MassFlow flow, SpecificEnergy thermal, SpecificEnergy mechanical) {
    /** {@return the specific physical exergy} */
    public SpecificEnergy specific() {
        return thermal.plus(mechanical);
    }

    /** {@return the exergy rate} */
    public Power rate() {
        return flow.times(specific());
    }
}
