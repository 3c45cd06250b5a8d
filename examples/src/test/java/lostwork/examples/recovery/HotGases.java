package lostwork.examples.recovery;

import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.CombustionAir;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.GasComposition;
import lostwork.fluid.gas.Species;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;

/** Gases and surroundings for the tests of the recovery plant. */
final class HotGases {
    static final ReferenceEnvironment AMBIENT =
            ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));

    private static final Fluid FLUE_GAS = FlueGas.of(
            Fuel.gas("methane", GasComposition.pure(Species.of("CH4"))), CombustionAir.excessAir(percent(60)));

    private HotGases() {}

    static HotGas flueGas(double kilogramsPerSecond, double supplyCelsius, double lowestCelsius) {
        final MassFlow flow = MassFlow.kilogramsPerSecond(kilogramsPerSecond);
        // About a quarter of the heat, enough to settle the class of the machines.
        final Power expected = Power.kilowatts(kilogramsPerSecond * 1.1 * (supplyCelsius - lowestCelsius) / 4);
        return new HotGas("gas", FLUE_GAS, flow, celsius(supplyCelsius), celsius(lowestCelsius), mbar(1008), expected);
    }

    static Recovery recovery(HotGas gas) {
        return Recovery.of(gas, AMBIENT, RecoveryDesign.smallWasteHeatPlant(), tried -> {});
    }
}
