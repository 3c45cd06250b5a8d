package lostwork.examples.recovery;

import java.util.Optional;
import lostwork.plant.Solution;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * A recovery plant solved at one evaporation pressure.
 *
 * @param plant the plant
 * @param solution its solution
 * @param limit what keeps the gas from being cooled further
 */
public record OperatingPoint(RecoveryPlant plant, Solution solution, Limit limit) {
    /** {@return the evaporation pressure} */
    public Pressure pressure() {
        return solution.value(plant.evaporationPressure());
    }

    /** {@return the temperature at which the water boils} */
    public Temperature boiling() {
        return plant.water().saturation(pressure()).temperature();
    }

    /** {@return generator power less what motors and fans take} */
    public Power netPower() {
        return solution.value(plant.netPower());
    }

    /** {@return the flow of steam} */
    public MassFlow steamFlow() {
        return solution.value(plant.turbine().inlet().flow());
    }

    /** {@return the temperature with which the gas leaves the boiler} */
    public Temperature gasOutlet() {
        return solution.value(plant.gasOutlet());
    }

    /** {@return the least temperature difference in the boiler} */
    public TemperatureSpan pinch() {
        return solution.value(plant.boiler().pinch());
    }

    /** {@return the share of vapour in the steam that leaves the turbine; empty where it is still superheated} */
    public Optional<Ratio> outletVapour() {
        return solution.state(plant.turbine().outlet()).vapourFraction();
    }
}
