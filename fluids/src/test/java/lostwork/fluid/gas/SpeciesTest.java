package lostwork.fluid.gas;

import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

class SpeciesTest {
    @Test
    void everyNameOfTheIndexIsReadable() {
        assertEquals(41, Species.all().count());
        Species.all().forEach(species -> {
            assertSame(species, Species.of(species.name()));
            assertEquals("verified", species.status());
            assertTrue(species.origin().startsWith("digits: "), species.origin());
        });
    }

    /** Atomic masses: elements.txt. Air is a rounded mixture, so its record's own mass differs by 2e-3 g/mol at most. */
    @Test
    void molarMassIsTheSumOfItsAtoms() {
        Species.all().forEach(species -> {
            double sum = 0;
            for (Element element : Element.values()) {
                sum += species.atoms(element) * element.atomicMass().inGramsPerMole();
            }
            assertEquals(
                    sum,
                    species.molarMass().inGramsPerMole(),
                    species.name().equals("Air") ? 2e-3 : 2e-5,
                    species.name());
        });
    }

    @Test
    void offersNearNames() {
        final UnknownSpeciesException refused = assertThrows(UnknownSpeciesException.class, () -> Species.of("co2"));
        assertEquals("co2", refused.name());
        assertEquals("CO2 (carbon dioxide)", refused.near().get(0));
        assertEquals(
                List.of("CH4 (methane)", "C2H6 (ethane)"),
                assertThrows(UnknownSpeciesException.class, () -> Species.of("methan"))
                        .near());
        assertTrue(assertThrows(UnknownSpeciesException.class, () -> Species.of("unobtainium"))
                .getMessage()
                .contains("Species.all()"));
    }

    @Test
    void refusesTemperaturesBeyondItsRange() {
        final Species fluorine = Species.of("F2");
        final OutOfRangeException refused =
                assertThrows(OutOfRangeException.class, () -> fluorine.molarEnthalpy(kelvin(1000.1)));
        assertEquals(1000, refused.highest());
        assertTrue(refused.getMessage().contains("F2"), refused.getMessage());
        assertThrows(OutOfRangeException.class, () -> fluorine.molarEntropy(kelvin(199.9)));
        fluorine.molarGibbsEnergy(kelvin(1000));
    }

    /** The printed ranges of the source meet within 1e-6 in cp/R; H and S are made to meet to rounding. */
    @Test
    void isContinuousAtTheJoints() {
        Species.all().forEach(species -> {
            for (double joint : new double[] {373.15, 600, 1000, 2000, 6000}) {
                final double below = Math.nextDown(joint);
                if (below <= species.lowestTemperature().si()
                        || joint >= species.highestTemperature().si()) {
                    continue;
                }
                final double cp = species.molarHeatCapacity(kelvin(joint)).si();
                final double h = species.molarEnthalpy(kelvin(joint)).si();
                final double s = species.molarEntropy(kelvin(joint)).si();
                assertEquals(cp, species.molarHeatCapacity(kelvin(below)).si(), 1e-6 * cp, species + " cp");
                assertEquals(h, species.molarEnthalpy(kelvin(below)).si(), 1e-7 * joint, species + " H");
                assertEquals(s, species.molarEntropy(kelvin(below)).si(), 1e-9 * s, species + " S");
            }
        });
    }

    /** Coefficients of nitrogen from 1000 K to 6000 K as printed: making the ranges meet changes them by nothing that counts. */
    @Test
    void joiningTheRangesLeavesThePrintedFunctions() {
        final double t = 3000;
        final double h = 8.31451
                * (-587712.406 / t
                        - 2239.249073 * Math.log(t)
                        + 6.06694922 * t
                        - 0.00061396855 * t * t / 2
                        + 1.491806679e-07 * t * t * t / 3
                        - 1.923105485e-11 * t * t * t * t / 4
                        + 1.061954386e-15 * t * t * t * t * t / 5
                        + 12832.10415);
        assertEquals(h, Species.N2.molarEnthalpy(kelvin(t)).si(), 0.002);
    }
}
