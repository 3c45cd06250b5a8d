package lostwork.fluid.gas;

import static lostwork.fluid.gas.CombustionAir.stoichiometric;
import static lostwork.fluid.gas.MoleFraction.hydrogen;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.fluid.gas.MoleFraction.propane;
import static lostwork.fluid.gas.MoleFraction.waterVapour;
import static lostwork.quantity.Pressure.pascal;
import static lostwork.quantity.Ratio.fraction;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.exergy.WaterVapourPressure;
import lostwork.quantity.Pressure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Combustion and dew points against published figures. */
class FlueGasTableTest {
    private static final double MMHG = 133.322;

    /**
     * Flame temperatures of complete combustion in stoichiometric air of O2 + 3.76 N2 at 1 atm and 298 K, as textbook tables
     * print them; the figures are from memory, so their source is uncertain to a few kelvins. The tables rest on older
     * heat capacities of water vapour (JANAF), which lie 1.4 % under this library's at 2300 K: with a quarter to a third of
     * the heat going into water that is 5 K to 8 K. Bounds: 5 K, for hydrogen, whose only product is water, 8 K.
     */
    @Test
    void flameTemperaturesOfCompleteCombustion() {
        final IdealGas air = IdealGas.of(GasComposition.byMole()
                .add(Species.O2, fraction(1))
                .add(Species.N2, fraction(3.76))
                .buildNormalised());
        assertEquals(2328, flame(methane(1), air), 5);
        assertEquals(2394, flame(propane(1), air), 5);
        assertEquals(2525, flame(hydrogen(1), air), 8);
    }

    private static double flame(MoleFraction fuel, IdealGas air) {
        final FlueGas gas = FlueGas.of(
                Fuel.gas(fuel.species().description(), GasComposition.of(fuel)),
                stoichiometric().from(air));
        assertEquals(
                gas.adiabaticFlameTemperature(kelvin(298)).si(),
                gas.adiabaticFlameTemperature(kelvin(298), kelvin(298)).si(),
                0.05);
        return gas.adiabaticFlameTemperature(kelvin(298)).si();
    }

    /**
     * Higher heating values of ISO 6976:1995, table 3, at 25 °C in kJ/mol, from memory. They rest on measured heats of
     * combustion, the polynomials on enthalpies of formation; the third column is half a unit of the last digit where both
     * agree, else the difference of the two, rounded up.
     */
    @ParameterizedTest
    @CsvSource({
        "CH4, 890.63, 0.07",
        "C2H6, 1560.69, 0.04",
        "C3H8, 2219.17, 0.005",
        "n-C4H10, 2877.40, 0.005",
        "iso-C4H10, 2868.20, 0.005",
        "C2H4, 1411.18, 0.005",
        "H2, 285.83, 0.005",
        "CO, 282.98, 0.006",
        "H2S, 562.01, 0.04",
        "NH3, 382.81, 0.006",
    })
    void heatingValuesOfPureGases(String name, double kilojoulePerMole, double bound) {
        final Species species = Species.of(name);
        final Fuel fuel = Fuel.gas(name, GasComposition.pure(species));
        assertEquals(
                kilojoulePerMole,
                fuel.higherHeatingValue().si() * species.molarMass().si() * 1e-3,
                bound);
    }

    /**
     * Verhoff, F.H., Banchero, J.T.: Predicting dew points of flue gases, Chem. Eng. Progress 70 (8) (1974) 71-72, with the
     * worked example of a boiler-engineering note: 93.44 mmHg of water, 0.0024917 mmHg of trioxide, 402 K, 129 °C.
     */
    @Test
    void acidDewPointOfTheWorkedExample() {
        final var dewPoint = AcidDewPoint.ofSulfuricAcid(pascal(93.44 * MMHG), pascal(0.0024917 * MMHG));
        assertEquals(402, dewPoint.inKelvin(), 0.5);
        assertEquals(129, dewPoint.inCelsius(), 0.5);
    }

    /**
     * A practical note on flue-gas dew points: 10 % water at 760 mmHg gives 46 °C; 20 % lies between 60 °C and 61 °C.
     */
    @Test
    void waterDewPoints() {
        // A fuel that leaves exactly so much water: nothing but the mole fraction counts.
        assertEquals(46, dewPoint(0.10), 0.5);
        assertEquals(60.5, dewPoint(0.20), 0.5);
    }

    private static double dewPoint(double water) {
        // Methane diluted with inert gas and steam so that the wet gas holds the wanted water: CH4 + 2 O2 in pure
        // oxygen.
        final double methane = 0.01;
        final double total = 2 * methane / water;
        assertEquals(true, total <= 1 + 2 * methane);
        final FlueGas gas = FlueGas.of(
                Fuel.gas(
                        "diluted methane",
                        GasComposition.byMole()
                                .add(Species.of("CH4"), fraction(methane))
                                .add(Species.N2, fraction(total - 3 * methane))
                                .buildNormalised()),
                stoichiometric().from(IdealGas.of(Species.O2)));
        assertEquals(water, gas.composition().moleFraction(Species.H2O).si(), 1e-15);
        return gas.waterDewPoint(pascal(760 * MMHG)).inCelsius();
    }

    /** The dew point depends on the mole fraction of water alone, whatever the gas came from. */
    @Test
    void humidAirAndFlueGasAgreeOnTheDewPoint() {
        final GasComposition wet = GasComposition.of(nitrogen(0.9), waterVapour(0.1));
        assertEquals(
                WaterVapourPressure.dewPoint(Pressure.pascal(0.1 * 760 * MMHG)).inCelsius(),
                dewPoint(wet.moleFraction(Species.H2O).si()),
                1e-9);
    }
}
