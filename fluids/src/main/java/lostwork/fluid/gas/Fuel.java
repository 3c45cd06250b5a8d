package lostwork.fluid.gas;

import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import lostwork.quantity.EmissionFactor;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import org.jspecify.annotations.Nullable;

/**
 * A fuel as combustion sees it: its elements per mass, and its heating value.
 *
 * <p>A gaseous fuel is given by its mole fractions; its heating values follow from the enthalpies of formation. A liquid
 * or solid fuel is given by its ultimate analysis as fired, with a heating value, measured or estimated, since its compounds are
 * unknown.
 *
 * <pre>{@code
 * Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03));
 * Fuel.ultimateAnalysis("heating oil").carbon(percent(86.5)).hydrogen(percent(13.4)).sulfur(percent(0.1))
 *         .lowerHeatingValue(megajoulesPerKilogram(42.7)).build();
 * }</pre>
 *
 * <p>Heating values hold at 298.15 K and 1 bar, for complete combustion to carbon dioxide, water, sulfur dioxide and
 * nitrogen: the lower one with the water as vapour, the higher one with liquid water. Immutable and thread-safe.
 */
public final class Fuel {
    /** Temperature of the heating values, in K. */
    static final double REFERENCE_TEMPERATURE_K = 298.15;

    private final String name;
    private final Map<Element, Double> molesPerKilogram;
    private final double ash;
    private final double enthalpy;
    private final String heatingValueOrigin;
    private final @Nullable IdealGas gas;

    private Fuel(
            String name,
            Map<Element, Double> molesPerKilogram,
            double ash,
            double enthalpy,
            String heatingValueOrigin,
            @Nullable IdealGas gas) {
        this.name = name;
        this.molesPerKilogram = molesPerKilogram;
        this.ash = ash;
        this.enthalpy = enthalpy;
        this.heatingValueOrigin = heatingValueOrigin;
        this.gas = gas;
        if (!(oxygenDemand() > 0)) {
            throw new IllegalArgumentException(name + " holds nothing that burns with oxygen; check its analysis");
        }
    }

    /**
     * {@return natural gas of an analysis}
     *
     * @param parts mole fractions, which sum to 1 within 1e-6
     * @throws IllegalArgumentException if the analysis is incomplete, or nothing in it burns
     */
    public static Fuel naturalGas(MoleFraction... parts) {
        return gas("natural gas", GasComposition.of(parts));
    }

    /**
     * {@return a gaseous fuel of an analysis}
     *
     * @param name its name, for tables and messages
     * @param composition its composition
     * @throws IllegalArgumentException if nothing in it burns, or it holds chlorine or fluorine
     */
    public static Fuel gas(String name, GasComposition composition) {
        final Map<Element, Double> moles = new EnumMap<>(Element.class);
        final double molarMass = composition.molarMassKilogramPerMole();
        double enthalpy = 0;
        for (int i = 0; i < composition.species().size(); i++) {
            final Species species = composition.species().get(i);
            final double amount = composition.fraction(i) / molarMass;
            species.atoms().forEach((element, count) -> {
                if (element == Element.CHLORINE || element == Element.FLUORINE) {
                    throw new IllegalArgumentException(name + " holds " + species.name()
                            + "; what chlorine and fluorine burn to is not settled by complete combustion");
                }
                moles.merge(element, amount * count, Double::sum);
            });
            enthalpy += amount * species.curve().enthalpy(REFERENCE_TEMPERATURE_K);
        }
        return new Fuel(
                name, moles, 0, enthalpy, "computed from the enthalpies of formation", IdealGas.of(name, composition));
    }

    /**
     * {@return a builder for a liquid or solid fuel, from mass fractions as fired}
     *
     * @param name its name, for tables and messages
     */
    public static UltimateAnalysis ultimateAnalysis(String name) {
        return new UltimateAnalysis(name);
    }

    /** {@return the name} */
    public String name() {
        return name;
    }

    /** {@return the lower heating value, with the water of the flue gas as vapour} */
    public SpecificEnergy lowerHeatingValue() {
        return SpecificEnergy.joulesPerKilogram(lowerHeatingValueJoulePerKilogram());
    }

    /** {@return the higher heating value, with the water of the flue gas as liquid} */
    public SpecificEnergy higherHeatingValue() {
        return SpecificEnergy.joulesPerKilogram(
                lowerHeatingValueJoulePerKilogram() + moles(Element.HYDROGEN) / 2 * condensationEnthalpy());
    }

    /** {@return where the heating values come from, in words: computed, given or estimated} */
    public String heatingValueOrigin() {
        return heatingValueOrigin;
    }

    /** {@return the fuel as a gas with its states; empty for a liquid or solid fuel} */
    public Optional<IdealGas> asGas() {
        return Optional.ofNullable(gas);
    }

    /** {@return the mass of ash per mass of fuel} */
    public Ratio ash() {
        return Ratio.fraction(ash);
    }

    /**
     * {@return the mass of an element per mass of fuel, bound and moisture included}
     *
     * @param element the element
     */
    public Ratio massFraction(Element element) {
        return Ratio.fraction(moles(element) * element.atomicMassKilogramPerMole());
    }

    /** {@return the mass of carbon dioxide per mass of fuel that complete combustion leaves, all carbon counted as burnt} */
    public Ratio carbonDioxidePerFuel() {
        return Ratio.fraction(moles(Element.CARBON) * Species.CO2.molarMassKilogramPerMole());
    }

    /** {@return the mass of carbon dioxide per heat of combustion, by the lower heating value} */
    public EmissionFactor emissionFactor() {
        return EmissionFactor.kilogramsPerJoule(carbonDioxidePerFuel().si() / lowerHeatingValueJoulePerKilogram());
    }

    /** {@return name and lower heating value} */
    @Override
    public String toString() {
        return String.format(
                Locale.ROOT, "%s, lower heating value %.3f MJ/kg", name, lowerHeatingValueJoulePerKilogram() / 1e6);
    }

    double moles(Element element) {
        return molesPerKilogram.getOrDefault(element, 0.0);
    }

    /** {@return the enthalpy at 298.15 K in J/kg, counted from the elements} */
    double enthalpy() {
        return enthalpy;
    }

    /** {@return the oxygen that complete combustion takes, mol O2 per kg of fuel} */
    double oxygenDemand() {
        return moles(Element.CARBON) + moles(Element.HYDROGEN) / 4 + moles(Element.SULFUR) - moles(Element.OXYGEN) / 2;
    }

    double lowerHeatingValueJoulePerKilogram() {
        return enthalpy - productEnthalpy(molesPerKilogram);
    }

    /** {@return the enthalpy at 298.15 K of the burnt fuel in J per kg of fuel, water as vapour} */
    private static double productEnthalpy(Map<Element, Double> moles) {
        return moles.getOrDefault(Element.CARBON, 0.0) * Species.CO2.curve().enthalpy(REFERENCE_TEMPERATURE_K)
                + moles.getOrDefault(Element.HYDROGEN, 0.0)
                        / 2
                        * Species.H2O.curve().enthalpy(REFERENCE_TEMPERATURE_K)
                + moles.getOrDefault(Element.SULFUR, 0.0) * Species.SO2.curve().enthalpy(REFERENCE_TEMPERATURE_K);
    }

    /** {@return what a mole of water vapour gives off when it condenses at 298.15 K, in J/mol} */
    private static double condensationEnthalpy() {
        return Species.H2O.curve().enthalpy(REFERENCE_TEMPERATURE_K)
                - Species.of("H2O(l)").curve().enthalpy(REFERENCE_TEMPERATURE_K);
    }

    /** Collects an ultimate analysis, in mass fractions of the fuel as fired; not thread-safe. */
    public static final class UltimateAnalysis {
        private final String name;
        private final Map<Element, Double> masses = new EnumMap<>(Element.class);
        private double moisture;
        private double ash;
        private double lower = Double.NaN;
        private double higher = Double.NaN;
        private boolean estimated;

        private UltimateAnalysis(String name) {
            this.name = name;
        }

        /**
         * Sets the carbon.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis carbon(Ratio share) {
            return element(Element.CARBON, share);
        }

        /**
         * Sets the hydrogen, without that of the moisture.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis hydrogen(Ratio share) {
            return element(Element.HYDROGEN, share);
        }

        /**
         * Sets the oxygen, without that of the moisture.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis oxygen(Ratio share) {
            return element(Element.OXYGEN, share);
        }

        /**
         * Sets the nitrogen.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis nitrogen(Ratio share) {
            return element(Element.NITROGEN, share);
        }

        /**
         * Sets the sulfur that burns.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis sulfur(Ratio share) {
            return element(Element.SULFUR, share);
        }

        /**
         * Sets the moisture.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis moisture(Ratio share) {
            moisture = checked("moisture", share);
            return this;
        }

        /**
         * Sets the ash, which takes no part.
         *
         * @param share mass fraction as fired
         * @return this builder
         */
        public UltimateAnalysis ash(Ratio share) {
            ash = checked("ash", share);
            return this;
        }

        /**
         * Sets the measured lower heating value, as fired.
         *
         * @param value per mass of fuel as fired, above 0
         * @return this builder
         */
        public UltimateAnalysis lowerHeatingValue(SpecificEnergy value) {
            lower = value.si();
            return this;
        }

        /**
         * Sets the measured higher heating value, as fired, instead of the lower one.
         *
         * @param value per mass of fuel as fired, above 0
         * @return this builder
         */
        public UltimateAnalysis higherHeatingValue(SpecificEnergy value) {
            higher = value.si();
            return this;
        }

        /**
         * Has the higher heating value estimated from the analysis, instead of giving one.
         *
         * <p>HHV = 34.91 c + 117.83 h + 10.05 s − 10.34 o − 1.51 n − 2.11 a, in MJ/kg with mass fractions as fired (the
         * published form is per dry mass; it is linear). Source: S. A. Channiwala, P. P. Parikh, Fuel 81 (2002) 1051-1063,
         * from memory; for solid, liquid and gaseous fuels, 1.5 % off on average, up to 4 % in single cases.
         *
         * @return this builder
         */
        public UltimateAnalysis estimatedHeatingValue() {
            estimated = true;
            return this;
        }

        /**
         * {@return the fuel}
         *
         * @throws IllegalArgumentException if the shares do not sum to 1 within 0.001, the rounding of a laboratory
         *     report, or not exactly one heating value is given
         * @throws OutOfRangeException if the lower heating value is not above 0
         */
        public Fuel build() {
            double sum = moisture + ash;
            for (double mass : masses.values()) {
                sum += mass;
            }
            if (!(Math.abs(sum - 1) <= 1e-3)) {
                throw new IllegalArgumentException(String.format(
                        Locale.ROOT,
                        "the ultimate analysis of %s sums to %.4f, not to 1 within 0.001; give all of carbon, hydrogen,"
                                + " oxygen, nitrogen, sulfur, moisture and ash as fired",
                        name,
                        sum));
            }
            final int ways = (Double.isNaN(lower) ? 0 : 1) + (Double.isNaN(higher) ? 0 : 1) + (estimated ? 1 : 0);
            if (ways != 1) {
                throw new IllegalArgumentException("the heating value of " + name
                        + (ways == 0 ? " is not given" : " is given in more than one way")
                        + "; give either the lower or the higher one, as fired, or have it estimated with"
                        + " estimatedHeatingValue()");
            }
            final Map<Element, Double> moles = new EnumMap<>(Element.class);
            final double total = sum;
            masses.forEach((element, mass) -> moles.put(element, mass / total / element.atomicMassKilogramPerMole()));
            final double water = moisture / total / Species.H2O.molarMassKilogramPerMole();
            moles.merge(Element.HYDROGEN, 2 * water, Double::sum);
            moles.merge(Element.OXYGEN, water, Double::sum);
            final double toLower = moles.get(Element.HYDROGEN) / 2 * condensationEnthalpy();
            final double heatingValue =
                    Double.isNaN(lower) ? (estimated ? channiwalaParikh() / total : higher) - toLower : lower;
            if (!(heatingValue > 0)) {
                throw new OutOfRangeException(
                        "lower heating value of " + name,
                        heatingValue,
                        Double.MIN_VALUE,
                        Double.MAX_VALUE,
                        "J/kg",
                        "a fuel gives off heat",
                        "");
            }
            return new Fuel(
                    name,
                    moles,
                    ash / total,
                    heatingValue + productEnthalpy(moles),
                    estimated ? "estimated by Channiwala and Parikh, 2002, 1.5 % off on average" : "as given",
                    null);
        }

        /** {@return the higher heating value in J/kg as fired} */
        private double channiwalaParikh() {
            return 1e6
                    * (34.91 * mass(Element.CARBON)
                            + 117.83 * mass(Element.HYDROGEN)
                            + 10.05 * mass(Element.SULFUR)
                            - 10.34 * mass(Element.OXYGEN)
                            - 1.51 * mass(Element.NITROGEN)
                            - 2.11 * ash);
        }

        private double mass(Element element) {
            return masses.getOrDefault(element, 0.0);
        }

        private UltimateAnalysis element(Element element, Ratio share) {
            masses.put(element, checked(element.name().toLowerCase(Locale.ROOT), share));
            return this;
        }

        private static double checked(String what, Ratio share) {
            if (!(share.si() >= 0 && share.si() <= 1)) {
                throw new OutOfRangeException(
                        "mass fraction of " + what, share.si(), 0, 1, "1", "a share of the fuel as fired", "");
            }
            return share.si();
        }
    }
}
