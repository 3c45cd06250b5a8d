package lostwork.fluid.gas;

import lostwork.exergy.WaterVapourPressure;
import lostwork.fluid.Fluid;
import lostwork.quantity.MolarEnergy;
import lostwork.quantity.MolarEntropy;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.Temperature;

/**
 * An ideal gas with temperature-dependent heat capacity: one species or a mixture of fixed composition.
 *
 * <h2>Formula</h2>
 * <p>p v = (R/M) T. Enthalpy and entropy are sums over the species at their partial pressures x p:
 * h = Σ x H(T)/M and s = Σ x (S(T) − R ln(x p/p°))/M, with p° = 1 bar and H, S of {@link Species}.
 *
 * <h2>Gas constant</h2>
 * <p>R is the exact 8.31446261815324 J/(mol K) in p v = R T, in the pressure term and in the entropy of mixing. These
 * three have to agree for the Maxwell relation (∂s/∂p)<sub>T</sub> = −(∂v/∂T)<sub>p</sub> to hold, and they do to the
 * last digit. The heat capacity is a measured function of temperature, whose unit is carried by the source's own
 * 8.31451 J/(mol K); no relation between h, s and v depends on that factor.
 *
 * <h2>Datum</h2>
 * <p>Enthalpy: the elements in their reference states at 298.15 K and 1 bar, so heats of reaction are differences of
 * enthalpies. Entropy: absolute (third law).
 *
 * <h2>Range</h2>
 * <p>The temperatures that all species cover, most often 200 K to 6000 K; 1 mPa to 100 MPa as far as the formulas go.
 * The gas does not condense and does not dissociate: below the dew point its states are those of a supersaturated
 * vapour, above about 1800 K those of a frozen composition.
 *
 * <p>Immutable and thread-safe.
 */
public sealed class IdealGas extends Fluid permits DryAir, HumidAir, FlueGas {
    private final IdealGasModel model;

    IdealGas(IdealGasModel model) {
        super(model);
        this.model = model;
    }

    /**
     * {@return the ideal gas of one species}
     *
     * @param species the species, a gas
     * @throws IllegalArgumentException if the species is not a gas
     */
    public static IdealGas of(Species species) {
        return of(species.description(), GasComposition.pure(species));
    }

    /**
     * {@return an ideal gas mixture, named by its composition}
     *
     * @param composition the composition
     */
    public static IdealGas of(GasComposition composition) {
        return of("gas (" + composition + ")", composition);
    }

    /**
     * {@return an ideal gas mixture with a name}
     *
     * @param name the name, for tables and messages
     * @param composition the composition
     */
    public static IdealGas of(String name, GasComposition composition) {
        return new IdealGas(new IdealGasModel(name, composition));
    }

    /** {@return the composition} */
    public final GasComposition composition() {
        return model.composition();
    }

    /**
     * {@return the temperature at which the gas has an enthalpy}
     *
     * @param enthalpy the specific enthalpy
     * @throws OutOfRangeException if the gas has it at no temperature of its range
     */
    public final Temperature temperatureAt(SpecificEnergy enthalpy) {
        return Temperature.kelvin(model.temperatureAtEnthalpy(enthalpy.si()));
    }

    /**
     * {@return the temperature at which the gas has an internal energy}
     *
     * @param internalEnergy the specific internal energy
     * @throws OutOfRangeException if the gas has it at no temperature of its range
     */
    public final Temperature temperatureAtInternalEnergy(SpecificEnergy internalEnergy) {
        return Temperature.kelvin(model.temperatureAtInternalEnergy(internalEnergy.si()));
    }

    /**
     * {@return the temperature at which the gas has an entropy under a pressure}
     *
     * @param pressure the absolute pressure
     * @param entropy the specific entropy
     * @throws OutOfRangeException if the gas has it at no temperature of its range
     */
    public final Temperature temperatureAt(Pressure pressure, SpecificEntropy entropy) {
        return Temperature.kelvin(model.temperatureAtEntropy(entropy.si(), pressure.si()));
    }

    /**
     * {@return the enthalpy that a mole of a species brings into the mixture: in an ideal gas that of the pure species}
     *
     * @param species the species
     * @param temperature the temperature
     * @throws OutOfRangeException if the temperature lies outside the range of the species
     */
    public final MolarEnergy partialMolarEnthalpy(Species species, Temperature temperature) {
        return species.molarEnthalpy(temperature);
    }

    /**
     * {@return the entropy that a mole of a species brings into the mixture, S(T) − R ln(x p/p°)}
     *
     * @param species the species, part of the mixture
     * @param temperature the temperature
     * @param pressure the absolute pressure of the mixture
     * @throws IllegalArgumentException if the species is not part of the mixture: the entropy has no limit there
     * @throws OutOfRangeException if the temperature lies outside the range of the species
     */
    public final MolarEntropy partialMolarEntropy(Species species, Temperature temperature, Pressure pressure) {
        final double x = composition().fraction(species);
        if (!(x > 0)) {
            throw new IllegalArgumentException(species.name() + " is not part of " + model.name()
                    + "; its partial molar entropy grows without limit as its mole fraction goes to zero");
        }
        return MolarEntropy.joulesPerMoleKelvin(species.molarEntropy(temperature)
                        .si()
                - IdealGasModel.MOLAR_GAS_CONSTANT * Math.log(x * pressure.si() / IdealGasModel.STANDARD_PRESSURE_PA));
    }

    /**
     * {@return the chemical potential of a species in the mixture, H − T S}
     *
     * @param species the species, part of the mixture
     * @param temperature the temperature
     * @param pressure the absolute pressure of the mixture
     * @throws IllegalArgumentException if the species is not part of the mixture
     * @throws OutOfRangeException if the temperature lies outside the range of the species
     */
    public final MolarEnergy chemicalPotential(Species species, Temperature temperature, Pressure pressure) {
        return MolarEnergy.joulesPerMole(partialMolarEnthalpy(species, temperature)
                        .si()
                - temperature.si()
                        * partialMolarEntropy(species, temperature, pressure).si());
    }

    /**
     * {@return the temperature at which water begins to condense from this gas, or frost below 273.16 K}
     *
     * <p>Where the vapour pressure of pure water or ice (IAPWS SR1-86(1992), R14-08(2011)) equals the partial pressure x p.
     * The states of this gas below it are those of a supersaturated vapour.
     *
     * @param pressure the absolute pressure of the gas
     * @throws OutOfRangeException if the gas holds no water, or more than the vapour pressure formula covers
     */
    public final Temperature waterDewPoint(Pressure pressure) {
        return WaterVapourPressure.dewPoint(Pressure.pascal(composition().fraction(Species.H2O) * pressure.si()));
    }

    /**
     * {@return the temperature at which sulfuric acid begins to condense from this gas, by {@link AcidDewPoint}}
     *
     * @param pressure the absolute pressure of the gas
     * @param conversion the part of the sulfur dioxide, in moles, that oxidises to trioxide on the way to the cold surface;
     *     common practice, no source: 1 % to 5 %, more with vanadium in the ash
     * @throws OutOfRangeException if the conversion is outside 0 to 1, or there is no trioxide with it, or no water
     */
    public final Temperature acidDewPoint(Pressure pressure, Ratio conversion) {
        if (!(conversion.si() >= 0 && conversion.si() <= 1)) {
            throw new OutOfRangeException(
                    "conversion of sulfur dioxide", conversion.si(), 0, 1, "1", "a share of the sulfur dioxide", "");
        }
        final double trioxide = composition().fraction(Species.of("SO3"))
                + conversion.si() * composition().fraction(Species.SO2);
        if (!(trioxide > 0)) {
            throw new OutOfRangeException(
                    "mole fraction of sulfur trioxide",
                    trioxide,
                    Double.MIN_VALUE,
                    1,
                    "1",
                    "acid dew point of " + model.name(),
                    "without trioxide there is no acid; ask for the water dew point");
        }
        return AcidDewPoint.ofSulfuricAcid(
                Pressure.pascal(composition().fraction(Species.H2O) * pressure.si()),
                Pressure.pascal(trioxide * pressure.si()));
    }

    /** {@return name and composition} */
    @Override
    public String toString() {
        return model.name() + ": " + model.composition();
    }
}
