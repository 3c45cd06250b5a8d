package lostwork.exergy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.StringReader;
import java.util.Map;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.testing.PrintedValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AirCompositionTest {
    /**
     * The standard chemical exergies R T0 ln(p0/p) in kJ/mol of the gaseous reference species, T0 = 298.15 K,
     * p0 = 101.325 kPa (Szargut, table of 1989, as printed by A. Valero et al., Towards an international legal reference
     * environment), from the partial pressures of the resource. They are printed to 0.01 and were computed from pressures
     * with more digits than are printed: where those have three, half a unit of the last is RT/2/p = 0.012 kJ/mol at most.
     */
    @ParameterizedTest
    @CsvSource({
        "NITROGEN, 0.72",
        "OXYGEN, 3.97",
        "CARBON_DIOXIDE, 19.87",
        "WATER, 9.49",
        "ARGON, 11.69",
        "HELIUM, 30.37",
        "NEON, 27.16",
        "KRYPTON, 34.36",
        "XENON, 40.33"
    })
    void partialPressuresGiveThePrintedChemicalExergies(AtmosphericGas gas, double printed) {
        final double pressure = AtmosphereTable.read("reference-atmosphere.tsv").get(gas);
        final double exergy = 8.31446261815324e-3 * 298.15 * Math.log(101.325 / pressure);
        assertEquals(printed, exergy, 0.005 + 0.012, gas::formula);
    }

    @Test
    void compositionsAddUpToOne() {
        for (final AirComposition air :
                new AirComposition[] {AirComposition.szargut1988(), AirComposition.standardAtmosphere1976()}) {
            assertEquals(
                    1,
                    air.gases().stream()
                            .mapToDouble(g -> air.moleFraction(g).si())
                            .sum(),
                    1e-15);
        }
        assertTrue(AirComposition.szargut1988().gases().contains(AtmosphericGas.WATER));
        assertEquals(
                0,
                AirComposition.szargut1988()
                        .dry()
                        .moleFraction(AtmosphericGas.WATER)
                        .si());
    }

    /**
     * Molar mass of the air of the U.S. Standard Atmosphere, 1976: 28.9644 kg/kmol as printed, with the molar masses of its
     * table 3 (from memory). The printed value is the plain sum over all ten gases, whose fractions add up to 0.999997; the
     * two gases that are left out of the resource are added back here.
     */
    @Test
    void molarMassOfDryAir() {
        final Map<AtmosphericGas, Double> molarMass = Map.of(
                AtmosphericGas.NITROGEN, 28.0134,
                AtmosphericGas.OXYGEN, 31.9988,
                AtmosphericGas.ARGON, 39.948,
                AtmosphericGas.CARBON_DIOXIDE, 44.00995,
                AtmosphericGas.NEON, 20.183,
                AtmosphericGas.HELIUM, 4.0026,
                AtmosphericGas.KRYPTON, 83.80,
                AtmosphericGas.XENON, 131.30);
        double sum = 2e-6 * 16.04303 + 5e-7 * 2.01594; // methane, hydrogen
        for (final var gas :
                AtmosphereTable.read("standard-atmosphere-1976.tsv").entrySet()) {
            sum += gas.getValue() * molarMass.get(gas.getKey());
        }
        PrintedValue.of("28.9644").assertMatches(sum, "molar mass of air, kg/kmol");
    }

    @Test
    void oneShareChangesTheOthersKeepTheirProportions() {
        final AirComposition before = AirComposition.standardAtmosphere1976();
        final AirComposition after = before.with(AtmosphericGas.CARBON_DIOXIDE, Ratio.partsPerMillion(420));
        assertEquals(420e-6, after.moleFraction(AtmosphericGas.CARBON_DIOXIDE).si(), 1e-18);
        assertEquals(
                before.moleFraction(AtmosphericGas.OXYGEN)
                        .over(before.moleFraction(AtmosphericGas.NITROGEN))
                        .si(),
                after.moleFraction(AtmosphericGas.OXYGEN)
                        .over(after.moleFraction(AtmosphericGas.NITROGEN))
                        .si(),
                1e-15);
    }

    @Test
    void badSharesAreRefused() {
        assertThrows(
                OutOfRangeException.class, () -> AirComposition.of(Map.of(AtmosphericGas.NITROGEN, Ratio.percent(79))));
        assertThrows(
                OutOfRangeException.class,
                () -> AirComposition.of(Map.of(
                        AtmosphericGas.NITROGEN, Ratio.percent(110), AtmosphericGas.OXYGEN, Ratio.percent(-10))));
        assertThrows(OutOfRangeException.class, () -> AirComposition.of(Map.of()));
        final AirComposition steam = AirComposition.of(Map.of(AtmosphericGas.WATER, Ratio.percent(100)));
        assertThrows(IllegalArgumentException.class, steam::dry);
        final AirComposition simple = AirComposition.of(
                Map.of(AtmosphericGas.NITROGEN, Ratio.percent(79), AtmosphericGas.OXYGEN, Ratio.percent(21)));
        assertEquals("N2 0.79000, O2 0.21000", simple.toString());
    }

    @ParameterizedTest
    @ValueSource(strings = {"N2", "N2\tx", "N2\t-1", "Qq\t1", "N2\t1\nN2\t2", "N2\t1\t2", "N2\tNaN"})
    void aBadLineIsNamed(String text) {
        final IllegalStateException e = assertThrows(
                IllegalStateException.class,
                () -> AtmosphereTable.parse("some.tsv", new BufferedReader(new StringReader("# head\n" + text))));
        assertTrue(e.getMessage().startsWith("data file some.tsv, line "), e.getMessage());
    }
}
