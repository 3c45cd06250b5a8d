package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Inlet;
import lostwork.plant.Variable;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;

/** Where a stream leaves the plant into its surroundings. */
public final class Discharge extends Component {
    private final Inlet inlet = inlet("inlet");

    /**
     * Creates a discharge.
     *
     * @param name its name
     */
    public Discharge(String name) {
        super(name);
    }

    /** {@return where the stream leaves the plant and enters the discharge} */
    public Inlet inlet() {
        return inlet;
    }

    /** {@return the mass flow} */
    public Variable<MassFlow> flow() {
        return inlet.flow();
    }

    /** {@return the temperature} */
    public Variable<Temperature> temperature() {
        return inlet.temperature();
    }

    /** {@return the absolute pressure} */
    public Variable<Pressure> pressure() {
        return inlet.pressure();
    }

    @Override
    public boolean isBoundary() {
        return true;
    }

    @Override
    protected void describe(Equations e) {}
}
