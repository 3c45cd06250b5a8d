package lostwork.fluid;

import java.util.List;

/**
 * Where a property model comes from, and how good its publishers say it is.
 *
 * @param formulation the name of the equation or formulation
 * @param sources the citations of equations, coefficients and check values
 * @param range the validity range in words
 * @param uncertainty the published uncertainty in words; says so where none is published
 * @param datum where enthalpy and entropy are zero
 */
public record Provenance(String formulation, List<String> sources, String range, String uncertainty, String datum) {
    /**
     * Copies the list of sources.
     *
     * @param formulation the name of the equation or formulation
     * @param sources the citations of equations, coefficients and check values
     * @param range the validity range in words
     * @param uncertainty the published uncertainty in words
     * @param datum where enthalpy and entropy are zero
     */
    public Provenance {
        sources = List.copyOf(sources);
    }
}
