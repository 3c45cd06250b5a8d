package lostwork.fluid.gas;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.StatePoint;

/** The primitive model of an ideal gas of fixed composition. */
final class IdealGasModel implements FluidModel {
    /** Molar gas constant, exact: 8.31446261815324 J/(mol K) (SI Brochure, 9th edition). */
    static final double MOLAR_GAS_CONSTANT = 8.31446261815324;

    /** Standard pressure of the data, 1 bar. */
    static final double STANDARD_PRESSURE_PA = 1e5;

    /** A computed value this far outside the range, relative, is rounded from its limit; pressures from an exponential. */
    private static final double ROUNDING = 1e-12;

    private static final double LOWEST_PRESSURE_PA = 1e-3;
    private static final double HIGHEST_PRESSURE_PA = 1e8;
    private static final String ENERGY_UNIT = "J/kg";
    private static final String ENTROPY_UNIT = "J/(kg K)";

    private final String name;
    private final GasComposition composition;
    private final double gasConstant;
    private final CaloricCurve curve;
    private final FluidRange range;
    private final Provenance provenance;

    IdealGasModel(String name, GasComposition composition, Provenance.Source... sources) {
        this.name = name;
        this.composition = composition;
        final double molarMass = composition.molarMassKilogramPerMole();
        gasConstant = MOLAR_GAS_CONSTANT / molarMass;
        final int n = composition.species().size();
        final List<CaloricCurve> curves = new ArrayList<>();
        final double[] weights = new double[n];
        double mixing = 0;
        for (int i = 0; i < n; i++) {
            final double x = composition.fraction(i);
            curves.add(composition.species().get(i).curve());
            weights[i] = x / molarMass;
            mixing -= x * Math.log(x);
        }
        curve = CaloricCurve.sum(curves, weights, gasConstant * mixing);
        range = new FluidRange(curve.lowest(), curve.highest(), LOWEST_PRESSURE_PA, HIGHEST_PRESSURE_PA, name);
        provenance = provenance(composition.toString(), composition.species(), range, sources);
    }

    static Provenance provenance(
            String composition, List<Species> species, FluidRange range, Provenance.Source... moreSources) {
        Provenance provenance = Provenance.of("ideal gas, nine-coefficient polynomials: " + composition)
                .withSource(
                        "McBride, B.J., Zehe, M.J., Gordon, S.: NASA Glenn Coefficients for Calculating Thermodynamic"
                                + " Properties of Individual Species, NASA/TP-2002-211556, 2002",
                        "see each species");
        for (Species one : species) {
            provenance = provenance.withSource(one.name(), one.origin());
        }
        provenance = provenance.withSource("molar gas constant: SI Brochure, 9th edition, 2019", "from memory, exact");
        for (Provenance.Source source : moreSources) {
            provenance = provenance.withSource(source.citation(), source.origin());
        }
        return provenance
                .withRange(String.format(
                        Locale.ROOT,
                        "%.2f K to %.0f K, low density",
                        range.lowestTemperature(),
                        range.highestTemperature()))
                .withUncertainty("none published with the coefficients")
                .withDatum("h: elements in their reference states at 298.15 K and 1 bar; s: absolute (third law)")
                .withReservation("p v = R T neglects the forces between molecules")
                .withReservation("nothing condenses and nothing dissociates");
    }

    GasComposition composition() {
        return composition;
    }

    CaloricCurve curve() {
        return curve;
    }

    double gasConstant() {
        return gasConstant;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public double molarMass() {
        return composition.molarMassKilogramPerMole();
    }

    @Override
    public FluidRange range() {
        return range;
    }

    @Override
    public Provenance provenance() {
        return provenance;
    }

    /** Zero: the polynomials themselves count from the elements, mixed or not. */
    @Override
    public double enthalpyFromElements() {
        return 0;
    }

    /** Zero: the polynomials themselves give absolute entropies, and mixing is counted. */
    @Override
    public double entropyFromAbsoluteZero() {
        return 0;
    }

    @Override
    public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
        final CaloricCurve.Segment segment = curve.at(temperature);
        final double lnT = Math.log(temperature);
        final double volumeByTemperature = gasConstant / pressure;
        final double volume = volumeByTemperature * temperature;
        out.setSinglePhase(
                temperature,
                pressure,
                volume,
                segment.enthalpy(temperature, lnT),
                segment.entropy(temperature, lnT) - gasConstant * Math.log(pressure / STANDARD_PRESSURE_PA),
                segment.heatCapacity(temperature),
                volumeByTemperature,
                -volume / pressure,
                Phase.GAS);
    }

    @Override
    public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
        range.requireTemperature(temperature);
        range.requirePressure(pressure);
        evaluate(temperature, pressure, PhaseSide.VAPOUR, out);
    }

    @Override
    public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
        range.requirePressure(pressure);
        evaluate(temperatureAtEnthalpy(enthalpy), pressure, PhaseSide.VAPOUR, out);
    }

    @Override
    public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        range.requirePressure(pressure);
        evaluate(temperatureAtEntropy(entropy, pressure), pressure, PhaseSide.VAPOUR, out);
    }

    @Override
    public void atPressureVolume(double pressure, double volume, StatePoint out) {
        atRounded(pressure * volume / gasConstant, pressure, out);
    }

    @Override
    public void atTemperatureVolume(double temperature, double volume, StatePoint out) {
        atRounded(temperature, gasConstant * temperature / volume, out);
    }

    @Override
    public void atTemperatureEntropy(double temperature, double entropy, StatePoint out) {
        range.requireTemperature(temperature);
        atRounded(temperature, pressureAt(temperature, entropy), out);
    }

    @Override
    public void atEnthalpyEntropy(double enthalpy, double entropy, StatePoint out) {
        final double temperature = temperatureAtEnthalpy(enthalpy);
        atRounded(temperature, pressureAt(temperature, entropy), out);
    }

    @Override
    public void atInternalEnergyVolume(double internalEnergy, double volume, StatePoint out) {
        atTemperatureVolume(temperatureAtInternalEnergy(internalEnergy), volume, out);
    }

    @Override
    public void atEntropyVolume(double entropy, double volume, StatePoint out) {
        // s = s°(T) - R ln(R T/(v p°))
        final double wanted = entropy + gasConstant * Math.log(gasConstant / (volume * STANDARD_PRESSURE_PA));
        atTemperatureVolume(
                curve.temperatureAtEntropy(wanted, gasConstant, "entropy less R ln T", ENTROPY_UNIT, name),
                volume,
                out);
    }

    /** Takes a computed temperature or pressure that rounding has carried over a limit as that limit. */
    private void atRounded(double temperature, double pressure, StatePoint out) {
        atTemperaturePressure(
                rounded(temperature, range.lowestTemperature(), range.highestTemperature()),
                rounded(pressure, range.lowestPressure(), range.highestPressure()),
                out);
    }

    private static double rounded(double value, double low, double high) {
        if (value < low && value >= low * (1 - ROUNDING)) {
            return low;
        }
        return value > high && value <= high * (1 + ROUNDING) ? high : value;
    }

    private double pressureAt(double temperature, double entropy) {
        return STANDARD_PRESSURE_PA * Math.exp((curve.entropy(temperature) - entropy) / gasConstant);
    }

    double temperatureAtEnthalpy(double enthalpy) {
        return curve.temperatureAtEnthalpy(enthalpy, 0, "enthalpy", ENERGY_UNIT, name);
    }

    double temperatureAtInternalEnergy(double internalEnergy) {
        return curve.temperatureAtEnthalpy(internalEnergy, gasConstant, "internal energy", ENERGY_UNIT, name);
    }

    double temperatureAtEntropy(double entropy, double pressure) {
        return curve.temperatureAtEntropy(
                entropy + gasConstant * Math.log(pressure / STANDARD_PRESSURE_PA),
                0,
                "entropy at 1 bar",
                ENTROPY_UNIT,
                name);
    }
}
