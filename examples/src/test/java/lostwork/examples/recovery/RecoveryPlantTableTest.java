package lostwork.examples.recovery;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.gas.DryAir;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import org.junit.jupiter.api.Test;

/**
 * The plant at a fixed pressure, calculated by hand from tables of Y. A. Cengel and M. A. Boles, Thermodynamics, all
 * figures from memory: air A-17, saturated water A-4, superheated steam A-6.
 *
 * <p>10 kg/s of air from 900 K to 500 K; steam of 4 MPa and 450 °C, condensed at 35 °C, condensate 33 °C; turbine 65 %,
 * generator 96 %, feed pump 50 %, motors 90 %, condenser fans 0.9 % of the heat, gas pressure loss 1.5 kPa, draught fan
 * 65 %. Tolerance: 0.3 %, the reading of the tables and the pump and fan work taken as v Δp.
 */
class RecoveryPlantTableTest {
    private static final double TOLERANCE = 0.003;

    @Test
    void agreesWithTheCalculationByHand() {
        final double gasHeat = 10 * (932.93 - 503.02);
        final double steamEnthalpy = 3331.2;
        final double idealVapour = (6.9386 - 0.5051) / 7.8466;
        final double idealOutlet = 146.64 + idealVapour * 2417.9;
        final double drop = 0.65 * (steamEnthalpy - idealOutlet);
        final double condensate = 138.28;
        final double pump = 0.001005 * (4000 - 5.63) / 0.5;
        final double steamFlow = gasHeat / (steamEnthalpy - condensate - pump);
        final double condenserHeat = steamEnthalpy - drop - condensate;
        final double draughtFan = 10 * 0.287 * 500 / 100.6 * 1.5 / 0.65;
        final double net = steamFlow * (0.96 * drop - pump / 0.9 - 0.009 * condenserHeat) - draughtFan / 0.9;

        final HotGas gas = new HotGas(
                "air",
                DryAir.standard(),
                MassFlow.kilogramsPerSecond(10),
                kelvin(900),
                kelvin(500),
                mbar(1013),
                Power.kilowatts(1000));
        final RecoveryPlant plant = new RecoveryPlant(
                gas, celsius(13), RecoveryDesign.smallWasteHeatPlant(), MachineSize.UP_TO_TWO_MEGAWATTS);
        final OperatingPoint point = plant.at(bar(40));

        assertEquals(Limit.LOWEST_GAS_TEMPERATURE, point.limit());
        assertClose(250.35, point.boiling().inCelsius());
        assertClose(gasHeat, point.solution().value(plant.boiler().duty()).inKilowatts());
        assertClose(steamFlow, point.steamFlow().inKilogramsPerSecond());
        assertClose(
                steamFlow * drop,
                point.solution().value(plant.turbine().power()).inKilowatts());
        assertClose(
                steamFlow * condenserHeat,
                point.solution().value(plant.condenser().duty()).inKilowatts());
        assertClose(net, point.netPower().inKilowatts());
    }

    private static void assertClose(double expected, double actual) {
        assertEquals(expected, actual, TOLERANCE * Math.abs(expected));
    }
}
