package lostwork.plant;

import lostwork.quantity.Power;

/** A port that electric power passes. Left unconnected, it is a boundary of the plant. */
public abstract class WirePort extends Port {
    private final Variable<Power> power;

    WirePort(String component, String name) {
        super(component, name);
        power = new Variable<>(component, name + " power", Power.KIND);
    }

    /** {@return the power, positive in the direction of the port} */
    public final Variable<Power> power() {
        return power;
    }
}
