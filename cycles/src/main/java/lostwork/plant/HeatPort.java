package lostwork.plant;

import lostwork.quantity.Power;
import lostwork.quantity.Temperature;

/**
 * A port that heat passes: a rate at a temperature. Left unconnected, it is a boundary of the plant, and its temperature
 * is that of the reservoir or surroundings behind it.
 */
public abstract class HeatPort extends Port {
    private final Variable<Power> rate;
    private final Variable<Temperature> temperature;

    HeatPort(String component, String name) {
        super(component, name);
        rate = new Variable<>(component, name + " rate", Power.KIND);
        temperature = new Variable<>(component, name + " temperature", Temperature.KIND);
    }

    /** {@return the heat rate, positive in the direction of the port} */
    public final Variable<Power> rate() {
        return rate;
    }

    /** {@return the temperature at which the heat passes} */
    public final Variable<Temperature> temperature() {
        return temperature;
    }
}
