package lostwork.fluid.gas;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.MixtureModel;
import lostwork.fluid.MixturePoint;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;

/**
 * The primitive model of an ideal gas mixture that takes its composition with each evaluation.
 *
 * <p>Volumes and enthalpies are those of the pure species; the partial molar entropy is S(T) − R ln(x p/p°). At a fixed
 * composition {@link #withComposition} gives the same numbers from one polynomial, which is faster.
 *
 * <pre>{@code
 * MixtureModel gases = IdealMixtureModel.of("flue gas", Species.N2, Species.O2, Species.CO2, Species.H2O);
 * }</pre>
 *
 * <p>Immutable and thread-safe; evaluations allocate nothing.
 */
public final class IdealMixtureModel implements MixtureModel {
    private final String name;
    private final List<Species> species;
    private final List<String> names;
    private final CaloricCurve[] curves;
    private final double[] molarMasses;
    private final FluidRange range;
    private final Provenance provenance;

    private IdealMixtureModel(String name, List<Species> species) {
        this.name = name;
        this.species = List.copyOf(species);
        names = this.species.stream().map(Species::name).toList();
        final int n = species.size();
        curves = new CaloricCurve[n];
        molarMasses = new double[n];
        final GasComposition.Builder equalParts = GasComposition.byMole();
        for (int i = 0; i < n; i++) {
            equalParts.add(species.get(i), 1);
            curves[i] = species.get(i).curve();
            molarMasses[i] = species.get(i).molarMassKilogramPerMole();
        }
        // Checks that all are gases, none is named twice, and a temperature range is left.
        final IdealGasModel any = new IdealGasModel(name, equalParts.buildNormalised());
        range = any.range();
        provenance = IdealGasModel.provenance("of variable composition", this.species, range);
    }

    /**
     * {@return the model of a mixture of some species}
     *
     * @param name the name, for tables and messages
     * @param species the species, gases, each once
     * @throws IllegalArgumentException if there is none, one is not a gas or occurs twice, or they have no temperature range
     *     in common
     */
    public static IdealMixtureModel of(String name, Species... species) {
        return new IdealMixtureModel(name, List.of(species));
    }

    /** {@return the species, in the order of all arrays} */
    public List<Species> species() {
        return species;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public List<String> components() {
        return names;
    }

    @Override
    public double molarMass(int component) {
        return molarMasses[component];
    }

    @Override
    public FluidRange range() {
        return range;
    }

    @Override
    public Provenance provenance() {
        return provenance;
    }

    @Override
    public void evaluate(
            double temperature, double pressure, double[] moleFractions, PhaseSide side, MixturePoint out) {
        final double r = IdealGasModel.MOLAR_GAS_CONSTANT;
        final double lnT = Math.log(temperature);
        final double lnP = Math.log(pressure / IdealGasModel.STANDARD_PRESSURE_PA);
        final double volume = r * temperature / pressure;
        double molarMass = 0;
        double enthalpy = 0;
        double entropy = 0;
        double heatCapacity = 0;
        for (int i = 0; i < curves.length; i++) {
            final double x = moleFractions[i];
            final CaloricCurve.Segment segment = curves[i].at(temperature);
            final double h = segment.enthalpy(temperature, lnT);
            final double s = segment.entropy(temperature, lnT) - r * (Math.log(x) + lnP);
            out.setPartial(i, volume, h, s);
            if (x > 0) {
                molarMass += x * molarMasses[i];
                enthalpy += x * h;
                entropy += x * s;
                heatCapacity += x * segment.heatCapacity(temperature);
            }
        }
        out.temperature = temperature;
        out.pressure = pressure;
        out.molarMass = molarMass;
        out.volume = volume;
        out.enthalpy = enthalpy;
        out.entropy = entropy;
        out.heatCapacity = heatCapacity;
        out.volumeByTemperature = r / pressure;
        out.volumeByPressure = -volume / pressure;
    }

    @Override
    public FluidModel withComposition(double... moleFractions) {
        if (moleFractions.length != curves.length) {
            throw new IllegalArgumentException(String.format(
                    Locale.ROOT,
                    "%d mole fractions are given for the %d species of %s: %s",
                    moleFractions.length,
                    curves.length,
                    name,
                    Species.names(species)));
        }
        final GasComposition.Builder builder = GasComposition.byMole();
        for (int i = 0; i < curves.length; i++) {
            builder.add(species.get(i), moleFractions[i]);
        }
        return new IdealGasModel(name, builder.build());
    }

    /**
     * {@return the gas at one composition, with typed states}
     *
     * @param parts mole fractions of some or all of the species, which sum to 1 within 1e-6
     * @throws IllegalArgumentException if a part is not of this mixture, or the sum is off
     */
    public IdealGas with(MoleFraction... parts) {
        final List<String> foreign = new ArrayList<>();
        for (MoleFraction part : parts) {
            if (!species.contains(part.species())) {
                foreign.add(part.species().name());
            }
        }
        if (!foreign.isEmpty()) {
            throw new IllegalArgumentException(String.join(", ", foreign) + " is not part of " + name
                    + ", which is made of " + Species.names(species));
        }
        return IdealGas.of(name, GasComposition.of(parts));
    }
}
