package lostwork.fluid.gas;

import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

/**
 * The species against other publications than the polynomials'. Sources, origin of the figures and the reasons for the
 * bound of each row stand in the two resource files; the bounds are differences between the sources, not tolerances of
 * this code.
 */
class SpeciesTableTest {
    private static final Temperature REFERENCE = kelvin(298.15);
    /** Room for rounding in our own arithmetic. */
    private static final double ARITHMETIC = 1e-9;

    @Test
    void agreesWithTheJanafTables() {
        final TestTable table = TestTable.read("janaf_checks.tsv");
        for (int i = 0; i < table.size(); i++) {
            final Species species = Species.of(table.text(i, "species"));
            final Temperature t = kelvin(table.number(i, "T_K"));
            final String where = species + " at " + t.inKelvin() + " K: ";
            assertEquals(
                    table.number(i, "cp_J_molK"),
                    species.molarHeatCapacity(t).inJoulesPerMoleKelvin(),
                    table.number(i, "bound_cp") + ARITHMETIC,
                    where + "cp");
            assertEquals(
                    table.number(i, "S_J_molK"),
                    species.molarEntropy(t).inJoulesPerMoleKelvin(),
                    table.number(i, "bound_S") + ARITHMETIC,
                    where + "S");
            assertEquals(
                    table.number(i, "H_minus_H298_kJ_mol"),
                    species.molarEnthalpy(t)
                            .minus(species.molarEnthalpy(REFERENCE))
                            .inKilojoulesPerMole(),
                    table.number(i, "bound_H") + ARITHMETIC,
                    where + "H - H(298.15 K)");
        }
        assertEquals(57, table.size());
    }

    @Test
    void agreesWithOtherValuesAt298() {
        final TestTable table = TestTable.read("reference_298.tsv");
        for (int i = 0; i < table.size(); i++) {
            final Species species = Species.of(table.text(i, "species"));
            assertEquals(
                    table.number(i, "cp_J_molK"),
                    species.molarHeatCapacity(REFERENCE).inJoulesPerMoleKelvin(),
                    table.number(i, "bound_cp") + ARITHMETIC,
                    species + " cp, " + table.text(i, "source_cp"));
            assertEquals(
                    table.number(i, "S_J_molK"),
                    species.molarEntropy(REFERENCE).inJoulesPerMoleKelvin(),
                    table.number(i, "bound_S") + ARITHMETIC,
                    species + " S, " + table.text(i, "source_S"));
            assertEquals(
                    table.number(i, "Hf_kJ_mol"),
                    species.molarEnthalpy(REFERENCE).inKilojoulesPerMole(),
                    table.number(i, "bound_Hf") + ARITHMETIC,
                    species + " formation enthalpy, " + table.text(i, "source_Hf"));
        }
        assertEquals(40, table.size());
    }

    /**
     * The enthalpy at 298.15 K is the formation enthalpy that the same record prints (NASA/TP-2002-211556): this holds with
     * the gas constant 8.31451 of the source only. Gases to 0.01 J/mol; liquid water to 0.1 J/mol, since its coefficients
     * of 1e9 carry ten digits.
     */
    @Test
    void returnsItsOwnFormationEnthalpies() {
        Species.all()
                .forEach(species -> assertEquals(
                        species.formationEnthalpy().si(),
                        species.molarEnthalpy(REFERENCE).si(),
                        species.aggregation() == Species.Aggregation.LIQUID ? 0.1 : 0.01,
                        species.name()));
    }
}
