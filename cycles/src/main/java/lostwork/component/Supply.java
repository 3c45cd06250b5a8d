package lostwork.component;

import lostwork.fluid.Fluid;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;

/** Where a stream enters the plant from its surroundings; it says which fluid the stream is. */
public final class Supply extends Component {
    private final Fluid fluid;
    private final Outlet outlet = outlet("outlet");

    /**
     * Creates a supply.
     *
     * @param name its name
     * @param fluid the fluid of the stream
     */
    public Supply(String name, Fluid fluid) {
        super(name);
        this.fluid = fluid;
    }

    /** {@return where the stream leaves the supply and enters the plant} */
    public Outlet outlet() {
        return outlet;
    }

    /** {@return the mass flow} */
    public Variable<MassFlow> flow() {
        return outlet.flow();
    }

    /** {@return the temperature} */
    public Variable<Temperature> temperature() {
        return outlet.temperature();
    }

    /** {@return the absolute pressure} */
    public Variable<Pressure> pressure() {
        return outlet.pressure();
    }

    @Override
    public boolean isBoundary() {
        return true;
    }

    @Override
    protected void describe(Equations e) {
        e.fluid(outlet, fluid);
    }
}
