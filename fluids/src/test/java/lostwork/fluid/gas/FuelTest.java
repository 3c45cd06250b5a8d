package lostwork.fluid.gas;

import static lostwork.fluid.gas.MoleFraction.carbonDioxide;
import static lostwork.fluid.gas.MoleFraction.carbonMonoxide;
import static lostwork.fluid.gas.MoleFraction.hydrogen;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.SpecificEnergy.megajoulesPerKilogram;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

class FuelTest {
    private static Fuel.UltimateAnalysis wood() {
        return Fuel.ultimateAnalysis("wood chips")
                .carbon(percent(35))
                .hydrogen(percent(4.2))
                .oxygen(percent(30))
                .nitrogen(percent(0.2))
                .moisture(percent(30))
                .ash(percent(0.6));
    }

    /** By hand: CO + 1/2 O2, 282.975 kJ/mol from the enthalpies of formation -110.535 and -393.510 kJ/mol. */
    @Test
    void heatingValueOfCarbonMonoxideByHand() {
        final Fuel fuel = Fuel.gas("CO", GasComposition.of(carbonMonoxide(1)));
        assertEquals(
                (393_510 - 110_535.196) / 0.0280101, fuel.lowerHeatingValue().si(), 1);
        assertEquals(fuel.lowerHeatingValue().si(), fuel.higherHeatingValue().si());
    }

    /** An inert part brings mass and no heat. */
    @Test
    void heatingValuesMixByMass() {
        final double pure = Fuel.naturalGas(methane(1)).lowerHeatingValue().si();
        final GasComposition half = GasComposition.of(methane(0.5), nitrogen(0.5));
        assertEquals(
                pure * half.massFraction(Species.of("CH4")).si(),
                Fuel.gas("lean gas", half).lowerHeatingValue().si(),
                1e-9 * pure);
    }

    /** Water from hydrogen and moisture: 0.042/0.00201588 + 0.30/0.01801528 mol/kg, condensing with 44.004 kJ/mol. */
    @Test
    void convertsBetweenTheHeatingValues() {
        final Fuel byLower = wood().lowerHeatingValue(megajoulesPerKilogram(12)).build();
        final double water = 0.042 / 0.00201588 + 0.30 / 0.01801528;
        assertEquals(
                water * 44_004,
                byLower.higherHeatingValue().minus(byLower.lowerHeatingValue()).si(),
                1e-5 * water * 44_004);
        final Fuel byHigher =
                wood().higherHeatingValue(byLower.higherHeatingValue()).build();
        assertEquals(12e6, byHigher.lowerHeatingValue().si(), 1e-3);
        assertEquals(12e6, byLower.lowerHeatingValue().si(), 1e-3);
        assertFalse(byLower.asGas().isPresent());
        assertThrows(
                IllegalStateException.class,
                () -> FlueGas.of(byLower, CombustionAir.stoichiometric())
                        .adiabaticFlameTemperature(
                                lostwork.quantity.Temperature.celsius(20), lostwork.quantity.Temperature.celsius(20)));
    }

    /** Elements in and out: what the gas holds came from fuel without ash, and air. */
    @Test
    void theGasHoldsTheElementsOfFuelAndAir() {
        final Fuel fuel = wood().lowerHeatingValue(megajoulesPerKilogram(12)).build();
        final FlueGas gas = FlueGas.of(fuel, CombustionAir.excessAir(percent(40)));
        for (Element element : Element.values()) {
            final double in = fuel.massFraction(element).si()
                    + gas.airPerFuel().si() * massFraction(gas.air().composition(), element);
            final double out = gas.gasPerFuel().si() * massFraction(gas.composition(), element);
            // Molar masses of species are printed to the fifth digit, so masses close to about 1e-7.
            assertEquals(in, out, 1e-6, element.symbol());
        }
    }

    private static double massFraction(GasComposition gas, Element element) {
        double mass = 0;
        for (Species species : gas.species()) {
            mass += gas.moleFraction(species).si()
                    * species.atoms(element)
                    * element.atomicMass().si();
        }
        return mass / gas.molarMass().si();
    }

    @Test
    void refusesAnalysesThatAreIncomplete() {
        assertTrue(assertThrows(
                        IllegalArgumentException.class,
                        () -> wood().moisture(percent(20))
                                .lowerHeatingValue(megajoulesPerKilogram(12))
                                .build())
                .getMessage()
                .contains("sums to 0.9000"));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> wood().build())
                .getMessage()
                .contains("heating value"));
        assertThrows(
                IllegalArgumentException.class,
                () -> wood().lowerHeatingValue(megajoulesPerKilogram(12))
                        .higherHeatingValue(megajoulesPerKilogram(14))
                        .build());
        assertThrows(
                OutOfRangeException.class,
                () -> wood().lowerHeatingValue(megajoulesPerKilogram(-1)).build());
        assertThrows(OutOfRangeException.class, () -> wood().sulfur(percent(-1)));
    }

    @Test
    void refusesWhatDoesNotBurn() {
        assertTrue(
                assertThrows(IllegalArgumentException.class, () -> Fuel.naturalGas(nitrogen(0.5), carbonDioxide(0.5)))
                        .getMessage()
                        .contains("nothing that burns"));
        assertTrue(assertThrows(
                        IllegalArgumentException.class,
                        () -> Fuel.gas("x", GasComposition.of(hydrogen(0.5), MoleFraction.of(Species.of("HCl"), 0.5))))
                .getMessage()
                .contains("HCl"));
    }

    /**
     * Measured higher heating values, from memory: n-octane (liquid) 47.89 MJ/kg, cellulose 17.35 MJ/kg, by the CRC Handbook
     * of Chemistry and Physics, heats of combustion. The correlation's authors state 1.45 % on average and 4 % at most.
     */
    @Test
    void estimatesTheHeatingValueFromTheAnalysis() {
        final Fuel octane = Fuel.ultimateAnalysis("n-octane")
                .carbon(percent(84.12))
                .hydrogen(percent(15.88))
                .estimatedHeatingValue()
                .build();
        assertEquals(47.89, octane.higherHeatingValue().inMegajoulesPerKilogram(), 0.0145 * 47.89);
        final Fuel cellulose = Fuel.ultimateAnalysis("cellulose")
                .carbon(percent(44.45))
                .hydrogen(percent(6.22))
                .oxygen(percent(49.33))
                .estimatedHeatingValue()
                .build();
        assertEquals(17.35, cellulose.higherHeatingValue().inMegajoulesPerKilogram(), 0.04 * 17.35);
        assertTrue(cellulose.heatingValueOrigin().contains("Channiwala"));
        // Moisture dilutes the dry fuel and nothing else.
        final Fuel moist = Fuel.ultimateAnalysis("moist cellulose")
                .carbon(percent(22.225))
                .hydrogen(percent(3.11))
                .oxygen(percent(24.665))
                .moisture(percent(50))
                .estimatedHeatingValue()
                .build();
        assertEquals(
                cellulose.higherHeatingValue().si() / 2,
                moist.higherHeatingValue().si(),
                1e-6);
    }

    /** By hand: 44.0095 g of CO2 per 16.04246 g of methane, over 50.03 MJ/kg; the usual 55 kg/GJ. */
    @Test
    void emissionFactorOfMethane() {
        final Fuel fuel = Fuel.naturalGas(methane(1));
        assertEquals(44.0095 / 16.04246, fuel.carbonDioxidePerFuel().si(), 1e-15);
        assertEquals(
                44.0095 / 16.04246 / fuel.lowerHeatingValue().si(),
                fuel.emissionFactor().si(),
                1e-20);
    }
}
