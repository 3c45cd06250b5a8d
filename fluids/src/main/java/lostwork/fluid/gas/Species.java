package lostwork.fluid.gas;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lostwork.quantity.MolarEnergy;
import lostwork.quantity.MolarEntropy;
import lostwork.quantity.MolarHeatCapacity;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Temperature;

/**
 * A chemical species with its thermodynamic functions at the standard pressure of 1 bar.
 *
 * <h2>Formula</h2>
 * <p>cp/R = a1/T² + a2/T + a3 + a4 T + a5 T² + a6 T³ + a7 T⁴, with H and S by integration and two constants b1, b2 [1].
 *
 * <h2>Datum</h2>
 * <p>H(298.15 K) is the enthalpy of formation from the elements in their reference states at 298.15 K and 1 bar; S is
 * absolute (third law).
 *
 * <h2>Range</h2>
 * <p>Most gases 200 K to 6000 K or 20000 K, limits included; each species says its own.
 *
 * <h2>Gas constant</h2>
 * <p>The printed functions are multiplied by R = 8.31451 J/(mol K), the value of the source: it alone returns the
 * enthalpies and entropies that the coefficients were fitted to. Volume, pressure and mixing use the exact constant; see
 * {@link IdealGas}.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * Species.of("CO2").molarEnthalpy(kelvin(1000));
 * }</pre>
 *
 * <p>Two species are the same exactly when they are the same object. Immutable and thread-safe.
 *
 * <p>[1] McBride, Zehe, Gordon, NASA/TP-2002-211556, 2002; the resource files carry the origin of each set of digits.
 */
public final class Species {
    /** Nitrogen. */
    public static final Species N2 = of("N2");
    /** Oxygen. */
    public static final Species O2 = of("O2");
    /** Argon. */
    public static final Species AR = of("Ar");
    /** Carbon dioxide. */
    public static final Species CO2 = of("CO2");
    /** Water vapour. */
    public static final Species H2O = of("H2O");
    /** Sulfur dioxide. */
    public static final Species SO2 = of("SO2");

    /** The state of matter that a species stands for. */
    public enum Aggregation {
        /** An ideal gas. */
        GAS,
        /** A pure liquid. */
        LIQUID,
        /** A pure solid. */
        SOLID
    }

    private final SpeciesRecord data;

    Species(SpeciesRecord data) {
        this.data = data;
    }

    /**
     * {@return the species of a name}
     *
     * @param name the chemical formula, with isomers and condensed phases marked: {@code "CO2"}, {@code "n-C4H10"},
     *     {@code "H2O(l)"}; capitals count
     * @throws UnknownSpeciesException if there is none; the message lists near names
     */
    public static Species of(String name) {
        return SpeciesIndex.ofModule().find(name);
    }

    /** {@return all known species, in the order of the index} */
    public static Stream<Species> all() {
        return SpeciesIndex.ofModule().names().stream().map(Species::of);
    }

    /** {@return the name, such as {@code "CO2"}} */
    public String name() {
        return data.name();
    }

    /** {@return the name in words, such as {@code "carbon dioxide"}} */
    public String description() {
        return data.description();
    }

    /** {@return the state of matter it stands for} */
    public Aggregation aggregation() {
        return data.aggregation();
    }

    /** {@return the molar mass} */
    public MolarMass molarMass() {
        return MolarMass.kilogramsPerMole(data.molarMass());
    }

    /**
     * {@return the atoms of an element in one molecule; 0 for an element that it does not hold}
     *
     * @param element the element
     */
    public double atoms(Element element) {
        return data.atoms().getOrDefault(element, 0.0);
    }

    /** {@return the enthalpy of formation at 298.15 K and 1 bar, as the source tabulates it} */
    public MolarEnergy formationEnthalpy() {
        return MolarEnergy.joulesPerMole(data.formationEnthalpy());
    }

    /** {@return the lowest temperature of the functions} */
    public Temperature lowestTemperature() {
        return Temperature.kelvin(data.curve().lowest());
    }

    /** {@return the highest temperature of the functions} */
    public Temperature highestTemperature() {
        return Temperature.kelvin(data.curve().highest());
    }

    /** {@return where the digits come from, in words} */
    public String origin() {
        return data.origin();
    }

    /** {@return whether the data passed their checks, in words; the species index says which} */
    public String status() {
        return data.status();
    }

    /**
     * {@return the isobaric heat capacity}
     *
     * @param temperature the temperature, within the range of the species
     * @throws OutOfRangeException if the temperature lies outside the range
     */
    public MolarHeatCapacity molarHeatCapacity(Temperature temperature) {
        return MolarHeatCapacity.joulesPerMoleKelvin(data.curve().heatCapacity(within(temperature)));
    }

    /**
     * {@return the enthalpy, counted from the elements at 298.15 K and 1 bar}
     *
     * @param temperature the temperature, within the range of the species
     * @throws OutOfRangeException if the temperature lies outside the range
     */
    public MolarEnergy molarEnthalpy(Temperature temperature) {
        return MolarEnergy.joulesPerMole(data.curve().enthalpy(within(temperature)));
    }

    /**
     * {@return the absolute entropy at 1 bar}
     *
     * @param temperature the temperature, within the range of the species
     * @throws OutOfRangeException if the temperature lies outside the range
     */
    public MolarEntropy molarEntropy(Temperature temperature) {
        return MolarEntropy.joulesPerMoleKelvin(data.curve().entropy(within(temperature)));
    }

    /**
     * {@return the Gibbs energy H − T S at 1 bar}
     *
     * @param temperature the temperature, within the range of the species
     * @throws OutOfRangeException if the temperature lies outside the range
     */
    public MolarEnergy molarGibbsEnergy(Temperature temperature) {
        final double t = within(temperature);
        return MolarEnergy.joulesPerMole(
                data.curve().enthalpy(t) - t * data.curve().entropy(t));
    }

    /** {@return the name} */
    @Override
    public String toString() {
        return data.name();
    }

    CaloricCurve curve() {
        return data.curve();
    }

    double molarMassKilogramPerMole() {
        return data.molarMass();
    }

    Map<Element, Double> atoms() {
        return data.atoms();
    }

    /** {@return the names of species, for a message} */
    static String names(List<Species> species) {
        return String.join(", ", species.stream().map(Species::name).toList());
    }

    private double within(Temperature temperature) {
        final double t = temperature.si();
        if (!(t >= data.curve().lowest() && t <= data.curve().highest())) {
            throw new OutOfRangeException(
                    "temperature",
                    t,
                    data.curve().lowest(),
                    data.curve().highest(),
                    "K",
                    "polynomials of " + data.name(),
                    "");
        }
        return t;
    }
}
