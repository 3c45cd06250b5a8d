package lostwork.fluid;

/**
 * The molar properties of a mixture at one temperature, pressure and composition, with their derivatives: what a
 * {@link MixtureModel} writes.
 *
 * <p>Mutable on purpose, like {@link StatePoint}: the caller owns it and hands it in again. Not thread-safe.
 */
public final class MixturePoint {
    /** Temperature in K. */
    public double temperature;
    /** Absolute pressure in Pa. */
    public double pressure;
    /** Molar mass of the mixture in kg/mol. */
    public double molarMass;
    /** Molar volume in m³/mol. */
    public double volume;
    /** Molar enthalpy in J/mol. */
    public double enthalpy;
    /** Molar entropy in J/(mol K), mixing included. */
    public double entropy;
    /** Molar isobaric heat capacity in J/(mol K). */
    public double heatCapacity;
    /** (∂v/∂T) at constant pressure and composition, in m³/(mol K). */
    public double volumeByTemperature;
    /** (∂v/∂p) at constant temperature and composition, in m³/(mol Pa). */
    public double volumeByPressure;

    private final double[] partialVolumes;
    private final double[] partialEnthalpies;
    private final double[] partialEntropies;

    /**
     * Creates an empty point.
     *
     * @param components the number of components, at least 1
     * @throws IllegalArgumentException if there is no component
     */
    public MixturePoint(int components) {
        if (components < 1) {
            throw new IllegalArgumentException("components = " + components + "; a mixture has at least 1");
        }
        partialVolumes = new double[components];
        partialEnthalpies = new double[components];
        partialEntropies = new double[components];
    }

    /** {@return the number of components} */
    public int components() {
        return partialVolumes.length;
    }

    /**
     * {@return the partial molar volume of a component in m³/mol}
     *
     * @param component its place in the model's list
     */
    public double partialVolume(int component) {
        return partialVolumes[component];
    }

    /**
     * {@return the partial molar enthalpy of a component in J/mol}
     *
     * @param component its place in the model's list
     */
    public double partialEnthalpy(int component) {
        return partialEnthalpies[component];
    }

    /**
     * {@return the partial molar entropy of a component in J/(mol K), its share in mixing included}
     *
     * @param component its place in the model's list
     */
    public double partialEntropy(int component) {
        return partialEntropies[component];
    }

    /**
     * {@return the chemical potential of a component in J/mol: μ = h − T s with its partial molar properties}
     *
     * @param component its place in the model's list
     */
    public double chemicalPotential(int component) {
        return partialEnthalpies[component] - temperature * partialEntropies[component];
    }

    /**
     * Writes the partial molar properties of one component; a model does so for each.
     *
     * @param component its place in the model's list
     * @param volume partial molar volume in m³/mol
     * @param enthalpy partial molar enthalpy in J/mol
     * @param entropy partial molar entropy in J/(mol K)
     */
    public void setPartial(int component, double volume, double enthalpy, double entropy) {
        partialVolumes[component] = volume;
        partialEnthalpies[component] = enthalpy;
        partialEntropies[component] = entropy;
    }

    /**
     * Turns the point into a single-phase state in mass terms.
     *
     * @param phase the phase region
     * @param out the point to fill
     */
    public void toMass(Phase phase, StatePoint out) {
        out.setSinglePhase(
                temperature,
                pressure,
                volume / molarMass,
                enthalpy / molarMass,
                entropy / molarMass,
                heatCapacity / molarMass,
                volumeByTemperature / molarMass,
                volumeByPressure / molarMass,
                phase);
    }
}
