package lostwork.fluid;

import java.util.List;

/**
 * The primitive interface of a fluid that takes a composition, in molar SI units (K, Pa, mol, J, m³).
 *
 * <p>Where a composition is unknown (a burner, a mixer, a dryer), amounts of substance are the natural variables: any
 * extensive property is Y = Σ n<sub>i</sub> y<sub>i</sub>, and the partial molar property y<sub>i</sub> is its exact
 * derivative with respect to the amount n<sub>i</sub> at constant temperature and pressure. So a {@link MixturePoint}
 * carries the partial molar volume, enthalpy and entropy of each component, and everything else follows: derivatives with
 * respect to mole fractions, specific properties, chemical potentials μ<sub>i</sub> = h<sub>i</sub> − T s<sub>i</sub>.
 *
 * <p>Where the composition is fixed, {@link #withComposition} gives a {@link FluidModel}, and with it every state pair.
 *
 * <p>Implementations are immutable and thread-safe, and their evaluations allocate nothing.
 */
public interface MixtureModel {
    /** {@return the name of the mixture, such as {@code "flue gas"}} */
    String name();

    /** {@return the names of the components, in the order of all arrays} */
    List<String> components();

    /**
     * {@return the molar mass of a component in kg/mol}
     *
     * @param component its place in {@link #components()}
     */
    double molarMass(int component);

    /** {@return the temperatures and pressures in which the model holds, at any composition} */
    FluidRange range();

    /** {@return where the model comes from and how good it is} */
    Provenance provenance();

    /**
     * Evaluates the single-phase properties of a mixture.
     *
     * @param temperature temperature in K, within the range
     * @param pressure absolute pressure in Pa, within the range
     * @param moleFractions mole fractions in the order of {@link #components()}, not below 0, with sum 1; not changed. A
     *     fraction of 0 gives an infinite partial molar entropy of that component and finite values of all else
     * @param side the side of the saturation line; {@link PhaseSide#VAPOUR} for gases
     * @param out the point to fill, made for as many components
     */
    void evaluate(double temperature, double pressure, double[] moleFractions, PhaseSide side, MixturePoint out);

    /**
     * {@return the model of the mixture at one composition, in mass terms}
     *
     * @param moleFractions mole fractions in the order of {@link #components()}, not below 0; copied. Their sum is 1 within
     *     1e-6 and is brought to 1 exactly
     * @throws IllegalArgumentException if there are too many or too few, or one is negative or NaN, or the sum is not 1
     */
    FluidModel withComposition(double... moleFractions);
}
