package lostwork.fluid.gas;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.CombustionAir.oxygenInDryGas;
import static lostwork.fluid.gas.CombustionAir.oxygenInWetGas;
import static lostwork.fluid.gas.CombustionAir.stoichiometric;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.SpecificEnergy.megajoulesPerKilogram;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;

class FlueGasTest {
    private static final Fuel NATURAL_GAS = Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03));
    private static final Fuel OIL = Fuel.ultimateAnalysis("heavy oil")
            .carbon(percent(86))
            .hydrogen(percent(11))
            .sulfur(percent(2.5))
            .nitrogen(percent(0.45))
            .ash(percent(0.05))
            .lowerHeatingValue(megajoulesPerKilogram(40.5))
            .build();

    @Test
    void readsAsTheUsersWriteIt() {
        final FlueGas gas = FlueGas.of(NATURAL_GAS, excessAir(percent(18)));
        final var hot = gas.state(celsius(412), mbar(1011));
        final var cold = gas.state(celsius(160), mbar(1009));
        assertTrue(hot.enthalpy().minus(cold.enthalpy()).si() > 0);
        assertEquals(412, gas.state(mbar(1011), hot.enthalpy()).temperature().inCelsius(), 1e-9);
        assertEquals(412, gas.state(mbar(1011), hot.entropy()).temperature().inCelsius(), 1e-9);
    }

    /** By hand: CH4 + 2 O2 in dry air; per mole of methane 2/0.209476 moles of air. */
    @Test
    void balancesMethaneByHand() {
        final FlueGas gas = FlueGas.of(Fuel.naturalGas(methane(1)), stoichiometric());
        final double air = 2 / 0.209476;
        final double total = 1 + air * 0.000319 + 2 + air * (0.78084 + 0.009365);
        assertEquals(2 / total, gas.composition().moleFraction(Species.H2O).si(), 1e-14);
        assertEquals(
                (1 + air * 0.000319) / total,
                gas.composition().moleFraction(Species.CO2).si(),
                1e-14);
        assertEquals(0, gas.oxygenInDryGas().si());
        assertEquals(
                air * DryAir.standard().composition().molarMass().si() / 0.01604246,
                gas.airPerFuel().si(),
                1e-12);
    }

    @Test
    void findsTheExcessAirFromMeasuredOxygen() {
        for (Fuel fuel : new Fuel[] {NATURAL_GAS, OIL}) {
            for (double excess : new double[] {0, 0.05, 0.18, 1, 9}) {
                final FlueGas gas = FlueGas.of(fuel, excessAir(Ratio.fraction(excess)));
                assertEquals(
                        excess,
                        FlueGas.of(fuel, oxygenInDryGas(gas.oxygenInDryGas()))
                                .excessAir()
                                .si(),
                        1e-11);
                assertEquals(
                        excess,
                        FlueGas.of(fuel, oxygenInWetGas(gas.oxygenInWetGas()))
                                .excessAir()
                                .si(),
                        1e-11);
            }
        }
    }

    @Test
    void refusesMoreOxygenThanTheAirHolds() {
        final OutOfRangeException refused = assertThrows(
                OutOfRangeException.class, () -> FlueGas.of(NATURAL_GAS, oxygenInDryGas(percent(20.9476))));
        assertEquals("oxygen in the dry flue gas", refused.quantity());
        assertEquals(0.209476, refused.highest(), 1e-15);
        assertThrows(OutOfRangeException.class, () -> excessAir(percent(-1)));
    }

    /** The polynomials of the elements are zero at 298.15 K to 1e-3 J/mol, which the tolerance leaves room for. */
    @Test
    void heatsAreDifferencesOfEnthalpy() {
        for (Fuel fuel : new Fuel[] {NATURAL_GAS, OIL}) {
            for (double excess : new double[] {0, 0.3, 2}) {
                final FlueGas gas = FlueGas.of(fuel, excessAir(Ratio.fraction(excess)));
                final double reactants = fuel.enthalpy()
                        + gas.airPerFuel().si()
                                * gas.air()
                                        .state(kelvin(298.15), bar(1))
                                        .enthalpy()
                                        .si();
                final double products = gas.gasPerFuel().si()
                        * gas.state(kelvin(298.15), bar(1)).enthalpy().si();
                assertEquals(
                        fuel.lowerHeatingValue().si(),
                        reactants - products,
                        1e-9 * fuel.lowerHeatingValue().si());
            }
        }
    }

    /** The heat that cools the flue gas from the flame to 298.15 K is the heating value, the reactants being at 298.15 K. */
    @Test
    void theFlameHoldsTheHeatingValue() {
        for (double excess : new double[] {0, 0.5, 3}) {
            final FlueGas gas = FlueGas.of(OIL, excessAir(Ratio.fraction(excess)));
            final var flame = gas.state(gas.adiabaticFlameTemperature(kelvin(298.15)), bar(1));
            final var cold = gas.state(kelvin(298.15), bar(1));
            assertEquals(
                    OIL.lowerHeatingValue().si(),
                    gas.gasPerFuel().si()
                            * flame.enthalpy().minus(cold.enthalpy()).si(),
                    1e-9 * 4e7);
        }
    }

    @Test
    void humidAirBringsItsWater() {
        final HumidAir humid = HumidAir.ofHumidityRatio(Ratio.fraction(0.02));
        final FlueGas dry = FlueGas.of(NATURAL_GAS, excessAir(percent(18)));
        final FlueGas wet = FlueGas.of(NATURAL_GAS, excessAir(percent(18)).from(humid));
        final double dryWater = dry.gasPerFuel().si()
                * dry.composition().massFraction(Species.H2O).si();
        final double wetWater = wet.gasPerFuel().si()
                * wet.composition().massFraction(Species.H2O).si();
        assertEquals(0.02 / 1.02 * wet.airPerFuel().si(), wetWater - dryWater, 1e-12);
        assertEquals(dry.oxygenInDryGas().si(), wet.oxygenInDryGas().si(), 1e-14);
        assertEquals(
                0.18,
                FlueGas.of(NATURAL_GAS, oxygenInWetGas(wet.oxygenInWetGas()).from(humid))
                        .excessAir()
                        .si(),
                1e-12);
        assertEquals(
                0.18,
                FlueGas.of(NATURAL_GAS, oxygenInDryGas(wet.oxygenInDryGas()).from(humid))
                        .excessAir()
                        .si(),
                1e-12);
    }

    @Test
    void refusesAirThatBurnsOrHoldsNoOxygen() {
        assertThrows(IllegalArgumentException.class, () -> stoichiometric().from(IdealGas.of(Species.N2)));
        final IdealGas foul = IdealGas.of(GasComposition.of(MoleFraction.oxygen(0.2), nitrogen(0.79), methane(0.01)));
        assertTrue(assertThrows(
                        IllegalArgumentException.class, () -> stoichiometric().from(foul))
                .getMessage()
                .contains("CH4"));
    }

    @Test
    void oilLeavesAcidButGasDoesNot() {
        final FlueGas oil = FlueGas.of(OIL, excessAir(percent(20)));
        assertTrue(oil.acidDewPoint(bar(1), percent(2)).si()
                > oil.waterDewPoint(bar(1)).si() + 50);
        final FlueGas gas = FlueGas.of(NATURAL_GAS, excessAir(percent(20)));
        assertThrows(OutOfRangeException.class, () -> gas.acidDewPoint(bar(1), percent(2)));
        assertThrows(OutOfRangeException.class, () -> oil.acidDewPoint(bar(1), percent(0)));
    }
}
