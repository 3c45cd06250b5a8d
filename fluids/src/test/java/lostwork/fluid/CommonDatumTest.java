package lostwork.fluid;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Pressure.pascal;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.GasComposition;
import lostwork.fluid.gas.IdealGas;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.gas.Species;
import lostwork.fluid.water.Water;
import lostwork.quantity.MolarMass;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Models of different makers count from the same zero points: enthalpy from the elements, entropy from 0 K. */
class CommonDatumTest {
    private static final double GAS_CONSTANT = 8.31446261815324;
    private static final Temperature STANDARD = kelvin(298.15);
    private static final Water WATER = Water.industrial();

    /** CODATA Key Values for Thermodynamics (Cox, Wagman, Medvedev, 1989) with their uncertainties; from memory. */
    @ParameterizedTest
    @CsvSource({
        "N2, 0, 0, 191.609, 0.004",
        "O2, 0, 0, 205.152, 0.005",
        "H2, 0, 0, 130.680, 0.003",
        "Ar, 0, 0, 154.846, 0.003",
        "H2O, -241.826, 0.040, 188.835, 0.010",
        "CO2, -393.51, 0.13, 213.785, 0.010",
        "CO, -110.53, 0.17, 197.660, 0.004",
        "SO2, -296.81, 0.20, 248.223, 0.050"
    })
    void gasesHaveTheStandardValuesOfCodata(
            String name, double enthalpy, double enthalpyBand, double entropy, double entropyBand) {
        final IdealGas gas = IdealGas.of(Species.of(name));
        final FluidState state = gas.state(STANDARD, bar(1));
        final double molarMass = gas.composition().molarMass().si();
        // The polynomials return their own formation values to some 1e-5 J/mol; entropies were refitted to 8.31451
        // J/(mol K).
        assertEquals(enthalpy, state.enthalpyFromElements().si() * molarMass / 1000, enthalpyBand + 1e-4);
        assertEquals(entropy, state.absoluteEntropy().si() * molarMass, entropyBand + 0.003);
    }

    @Test
    void aPerfectGasSaysThatItHasNoFormationData() {
        final PerfectGas air = PerfectGas.of("air", MolarMass.gramsPerMole(28.96), Ratio.fraction(1.4));
        final FluidState state = air.state(bar(1), celsius(20));
        assertThrows(UndefinedPropertyException.class, state::enthalpyFromElements);
        final var noEntropy = assertThrows(UndefinedPropertyException.class, state::absoluteEntropy);
        assertTrue(noEntropy.getMessage().contains("air"), noEntropy.getMessage());
    }

    /**
     * Thin steam of the one model is the ideal gas of the other. The bands are the uncertainties of the formation data of
     * liquid and gas, 0.040 kJ/mol each and 0.03 and 0.010 J/(mol K) (CODATA 1989, from memory), over the molar mass.
     */
    @ParameterizedTest
    @ValueSource(doubles = {298.15, 350, 400, 500, 600, 800, 1000})
    void thinSteamIsTheIdealGasOfWater(double temperature) {
        final FluidState steam = WATER.state(kelvin(temperature), pascal(10));
        final FluidState gas = IdealGas.of(Species.H2O).state(kelvin(temperature), pascal(10));
        assertEquals(
                gas.enthalpyFromElements().inKilojoulesPerKilogram(),
                steam.enthalpyFromElements().inKilojoulesPerKilogram(),
                0.080 / 0.018015);
        assertEquals(gas.absoluteEntropy().si(), steam.absoluteEntropy().si(), 0.040 / 0.018015);
    }

    /**
     * Liquid by one model and vapour by the other are in equilibrium where their Gibbs energies meet: the pressure found is
     * the vapour pressure. 80 J/mol of uncertainty over R T is 3.2 % of pressure.
     */
    @Test
    void equalGibbsEnergiesOfTwoModelsGiveTheVapourPressure() {
        final Pressure saturation = WATER.saturation(STANDARD).liquid().pressure();
        final double liquid = gibbs(WATER.saturation(STANDARD).liquid());
        final double gas = gibbs(IdealGas.of(Species.H2O).state(STANDARD, saturation));
        final double molarMass = Species.H2O.molarMass().si();
        final double found = saturation.si() * Math.exp((liquid - gas) * molarMass / (GAS_CONSTANT * 298.15));
        // 3169.9 Pa: IAPWS SR1-86(1992) at 25 °C, from memory.
        assertEquals(3169.9, found, 0.032 * 3169.9);
        // And the liquid of the gas data, whose pressure effect v (p - 1 bar) is 2 J/mol.
        final Species other = Species.of("H2O(l)");
        assertEquals(other.molarGibbsEnergy(STANDARD).si(), liquid * molarMass, 40 + 298.15 * 0.03 + 2);
    }

    /** 43.99 kJ/mol, the difference of the two CODATA formation enthalpies 285.830 and 241.826 (from memory): +- 0.08. */
    @Test
    void liquidAndGasDifferByTheHeatOfEvaporation() {
        final double liquid =
                WATER.state(STANDARD, bar(1)).enthalpyFromElements().si();
        final double gas = IdealGas.of(Species.H2O)
                .state(STANDARD, bar(1))
                .enthalpyFromElements()
                .si();
        assertEquals(44.004, (gas - liquid) * 0.018015268 / 1000, 0.08);
        // The steam tables' own heat of evaporation at 25 °C, 2441.7 kJ/kg (IAPWS, from memory), with the real vapour's
        // -0.06 kJ/kg.. below the ideal one inside the band.
        final Saturation saturation = WATER.saturation(STANDARD);
        assertEquals(
                2441.7,
                saturation
                        .vapour()
                        .enthalpy()
                        .minus(saturation.liquid().enthalpy())
                        .inKilojoulesPerKilogram(),
                0.05);
        assertEquals(2441.7, (gas - liquid) / 1000, 0.08 / 0.018015);
    }

    /** Water of the steam tables sprayed into flue gas of the gas data: the mixture's temperature by two separate ways. */
    @Test
    void waterSprayedIntoFlueGasClosesTheBalance() {
        final FlueGas gas =
                FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));
        final double spray = 0.05;
        final GasComposition.Builder builder = GasComposition.byMass();
        for (Species species : gas.composition().species()) {
            final double share = gas.composition().massFraction(species).si() + (species == Species.H2O ? spray : 0);
            builder.add(species, Ratio.fraction(share / (1 + spray)));
        }
        final IdealGas moist = IdealGas.of("moist gas", builder.build());

        final FluidState hot = gas.state(celsius(400), mbar(1013));
        final FluidState water = WATER.state(celsius(20), bar(6));
        final SpecificEnergy total =
                SpecificEnergy.joulesPerKilogram((hot.enthalpyFromElements().si()
                                + spray * water.enthalpyFromElements().si())
                        / (1 + spray));
        final FluidState mixed = moist.state(mbar(1013), total);
        assertEquals(total.si(), mixed.enthalpyFromElements().si(), 1e-6);

        // The other way needs no formation data: the gas cools by what the steam tables say the spray takes up.
        final double taken = spray
                * WATER.state(mixed.temperature(), pascal(1000))
                        .enthalpy()
                        .minus(water.enthalpy())
                        .si();
        final double given = hot.enthalpy()
                .minus(gas.state(mixed.temperature(), mbar(1013)).enthalpy())
                .si();
        // 0.08 kJ/mol of formation data are 4.4 kJ per kg of water.
        assertEquals(taken, given, spray * 0.08e3 / 0.018015);
        final double generated = (1 + spray) * mixed.absoluteEntropy().si()
                - hot.absoluteEntropy().si()
                - spray * water.absoluteEntropy().si();
        assertTrue(generated > 0, "entropy generated: " + generated);
    }

    /** Gases mixed at one temperature and pressure gain -R sum x ln x, the only term (ideal mixture). */
    @Test
    void mixingGainsTheEntropyOfMixing() {
        final double[] x = {0.7, 0.2, 0.1};
        final Species[] species = {Species.N2, Species.CO2, Species.H2O};
        final GasComposition.Builder builder = GasComposition.byMole();
        double apart = 0;
        double mixing = 0;
        double enthalpy = 0;
        for (int i = 0; i < x.length; i++) {
            builder.add(species[i], Ratio.fraction(x[i]));
            final FluidState pure = IdealGas.of(species[i]).state(celsius(250), bar(3));
            final double molarMass = species[i].molarMass().si();
            apart += x[i] * pure.absoluteEntropy().si() * molarMass;
            enthalpy += x[i] * pure.enthalpyFromElements().si() * molarMass;
            mixing -= GAS_CONSTANT * x[i] * Math.log(x[i]);
        }
        final IdealGas mixture = IdealGas.of("mixture", builder.build());
        final FluidState mixed = mixture.state(celsius(250), bar(3));
        final double molarMass = mixture.composition().molarMass().si();
        assertEquals(mixing, mixed.absoluteEntropy().si() * molarMass - apart, 1e-10);
        assertEquals(enthalpy, mixed.enthalpyFromElements().si() * molarMass, 1e-8);
    }

    /** CH4 + 2 O2 = CO2 + 2 H2O(l), products' water by the steam tables: 890.8 kJ/mol (heat of combustion; from memory). */
    @Test
    void combustionToLiquidWaterIsTheHigherHeatingValue() {
        final double released = molarEnthalpy("CH4")
                + 2 * molarEnthalpy("O2")
                - molarEnthalpy("CO2")
                - 2 * WATER.state(STANDARD, bar(1)).enthalpyFromElements().si() * 0.018015268;
        assertEquals(890.8, released / 1000, 0.5);
        assertEquals(
                released / 0.01604246,
                Fuel.naturalGas(methane(1)).higherHeatingValue().si(),
                2 * 0.04e3 / 0.01604246);
    }

    private static double molarEnthalpy(String name) {
        final IdealGas gas = IdealGas.of(Species.of(name));
        return gas.state(STANDARD, bar(1)).enthalpyFromElements().si()
                * gas.composition().molarMass().si();
    }

    private static double gibbs(FluidState state) {
        return state.enthalpyFromElements().si()
                - state.temperature().si() * state.absoluteEntropy().si();
    }
}
