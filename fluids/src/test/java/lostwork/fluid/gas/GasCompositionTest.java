package lostwork.fluid.gas;

import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.fluid.gas.MoleFraction.oxygen;
import static lostwork.quantity.Ratio.fraction;
import static lostwork.quantity.Ratio.percent;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

class GasCompositionTest {
    @Test
    void acceptsTheRoundingOfAnAnalysisAndNoMore() {
        final GasComposition air = GasComposition.of(nitrogen(0.7900005), oxygen(0.21));
        assertEquals(
                1,
                air.moleFraction(Species.N2).si() + air.moleFraction(Species.O2).si(),
                1e-15);
        final IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> GasComposition.of(nitrogen(0.79), oxygen(0.20)));
        assertTrue(refused.getMessage().contains("sum to 0.99"), refused.getMessage());
        assertTrue(refused.getMessage().contains("buildNormalised()"), refused.getMessage());
    }

    @Test
    void normalisesOnRequest() {
        final GasComposition gas = GasComposition.byMole()
                .add(Species.O2, fraction(1))
                .add(Species.N2, fraction(3.76))
                .buildNormalised();
        assertEquals(1 / 4.76, gas.moleFraction(Species.O2).si(), 1e-16);
        assertThrows(
                IllegalArgumentException.class, () -> GasComposition.byMole().buildNormalised());
    }

    @Test
    void convertsMassFractionsBothWays() {
        final GasComposition gas = GasComposition.byMass()
                .add(Species.CO2, percent(30))
                .add(Species.N2, percent(70))
                .build();
        assertEquals(0.30, gas.massFraction(Species.CO2).si(), 1e-15);
        assertEquals(0.70, gas.massFraction(Species.N2).si(), 1e-15);
        // By hand: 0.30/44.0095 and 0.70/28.0134 kmol per kg.
        assertEquals(
                0.30 / 44.0095 / (0.30 / 44.0095 + 0.70 / 28.0134),
                gas.moleFraction(Species.CO2).si(),
                1e-15);
        assertEquals(1e-3 / (0.30 / 44.0095 + 0.70 / 28.0134), gas.molarMass().si(), 1e-16);
    }

    @Test
    void refusesWhatIsNoMixtureOfGases() {
        assertThrows(IllegalArgumentException.class, () -> GasComposition.of(nitrogen(0.5), nitrogen(0.5)));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> GasComposition.pure(Species.of("H2O(l)")))
                .getMessage()
                .contains("liquid water"));
        assertThrows(OutOfRangeException.class, () -> nitrogen(1.01));
        assertThrows(OutOfRangeException.class, () -> nitrogen(-0.01));
        assertThrows(OutOfRangeException.class, () -> nitrogen(Double.NaN));
        assertThrows(OutOfRangeException.class, () -> GasComposition.byMole().add(Species.N2, fraction(-1)));
    }

    @Test
    void wetsADryAnalysis() {
        final GasComposition dry = GasComposition.of(nitrogen(0.8), oxygen(0.2));
        final GasComposition wet = dry.with(Species.H2O, percent(15));
        assertEquals(0.15, wet.moleFraction(Species.H2O).si(), 1e-15);
        assertEquals(0.8 * 0.85, wet.moleFraction(Species.N2).si(), 1e-15);
        assertEquals(0.8, wet.without(Species.H2O).moleFraction(Species.N2).si(), 1e-15);
        assertEquals(
                0.10,
                wet.with(Species.H2O, percent(10)).moleFraction(Species.H2O).si(),
                1e-15);
        assertThrows(OutOfRangeException.class, () -> dry.with(Species.H2O, percent(101)));
        assertThrows(
                IllegalArgumentException.class,
                () -> GasComposition.pure(Species.H2O).with(Species.H2O, percent(10)));
    }

    @Test
    void dropsWhatIsAbsent() {
        final GasComposition gas = GasComposition.of(nitrogen(1), oxygen(0));
        assertEquals(List.of(Species.N2), gas.species());
        assertEquals(0, gas.moleFraction(Species.O2).si());
        assertEquals(GasComposition.pure(Species.N2), gas);
        assertThrows(IllegalArgumentException.class, () -> gas.without(Species.N2));
        assertEquals(
                "N2 0.7900, O2 0.2100",
                GasComposition.of(nitrogen(0.79), oxygen(0.21)).toString());
    }
}
