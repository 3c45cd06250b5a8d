package lostwork.exergy;

import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/**
 * An equilibrium state of some matter, as far as the laws of exergy need it.
 *
 * <p>The property models implement it; the laws here do not know which model stands behind a state. Energies and
 * entropies count from the model's own datum, so only differences within one model have a meaning.
 */
public interface ThermodynamicState {
    /** {@return the temperature} */
    Temperature temperature();

    /** {@return the absolute pressure} */
    Pressure pressure();

    /** {@return the specific volume} */
    SpecificVolume volume();

    /** {@return the specific internal energy} */
    SpecificEnergy internalEnergy();

    /** {@return the specific enthalpy} */
    SpecificEnergy enthalpy();

    /** {@return the specific entropy} */
    SpecificEntropy entropy();

    /**
     * {@return the same matter at another temperature and pressure, in stable equilibrium and with the same composition}
     *
     * @param temperature the temperature to bring it to
     * @param pressure the absolute pressure to bring it to
     * @throws lostwork.quantity.OutOfRangeException if the model does not hold there
     */
    ThermodynamicState broughtTo(Temperature temperature, Pressure pressure);
}
