package lostwork.fluid.gas;

import java.util.List;
import java.util.Locale;
import lostwork.fluid.Provenance;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * The gas that complete combustion of a fuel leaves: carbon dioxide, water, sulfur dioxide, nitrogen, the unused oxygen
 * and the rare gases, as an ideal mixture.
 *
 * <pre>{@code
 * var gas = FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));
 * gas.state(celsius(412), mbar(1011));
 * gas.waterDewPoint(mbar(1011));
 * }</pre>
 *
 * <h2>Limits of the model</h2>
 * <p>All water stays vapour: below {@link #waterDewPoint} a state is that of a supersaturated gas, whose enthalpy misses
 * the heat of condensation. Ash leaves the balance without its heat. Above about 1800 K real flue gas dissociates and is
 * colder than {@link #adiabaticFlameTemperature} says.
 *
 * <p>Caution: dew points and flame temperatures are engineering estimates; the choice of materials, and firing itself,
 * fall under local codes and licensed practice.
 */
public final class FlueGas extends IdealGas {
    private final Fuel fuel;
    private final IdealGas air;
    private final double excess;
    private final double airPerFuel;
    private final double gasPerFuel;

    private FlueGas(Fuel fuel, IdealGas air, double excess, double airPerFuel, GasComposition composition) {
        super(new IdealGasModel(
                String.format(Locale.ROOT, "flue gas of %s, excess air %.1f %%", fuel.name(), 100 * excess),
                composition,
                new Provenance.Source("composition: complete combustion", "computed by the balance of elements")));
        this.fuel = fuel;
        this.air = air;
        this.excess = excess;
        this.airPerFuel = airPerFuel;
        gasPerFuel = 1 - fuel.ash().si() + airPerFuel;
    }

    /**
     * {@return the gas that a fuel leaves}
     *
     * @param fuel the fuel
     * @param combustionAir how much of which air
     * @throws OutOfRangeException if a measured oxygen is not below that of the air
     */
    public static FlueGas of(Fuel fuel, CombustionAir combustionAir) {
        final IdealGas air = combustionAir.air();
        final double excess = combustionAir.excessFor(fuel);
        final GasComposition airComposition = air.composition();
        final double airMoles = fuel.oxygenDemand() * (1 + excess) / airComposition.fraction(Species.O2);
        final GasComposition.Builder gas = GasComposition.byMole();
        gas.add(Species.N2, fuel.moles(Element.NITROGEN) / 2 + airMoles * airComposition.fraction(Species.N2));
        gas.add(Species.O2, fuel.oxygenDemand() * excess);
        gas.add(Species.CO2, fuel.moles(Element.CARBON) + airMoles * airComposition.fraction(Species.CO2));
        gas.add(Species.H2O, fuel.moles(Element.HYDROGEN) / 2 + airMoles * airComposition.fraction(Species.H2O));
        gas.add(Species.SO2, fuel.moles(Element.SULFUR) + airMoles * airComposition.fraction(Species.SO2));
        for (Element rare : RARE_GASES) {
            final Species species = Species.of(rare.symbol());
            gas.add(species, fuel.moles(rare) + airMoles * airComposition.fraction(species));
        }
        return new FlueGas(
                fuel, air, excess, airMoles * airComposition.molarMassKilogramPerMole(), gas.buildNormalised());
    }

    private static final List<Element> RARE_GASES =
            List.of(Element.ARGON, Element.HELIUM, Element.NEON, Element.KRYPTON, Element.XENON);

    /** {@return whether a species leaves a flame as it came, as far as this model goes} */
    static boolean passesUnchanged(Species species) {
        return species == Species.N2
                || species == Species.O2
                || species == Species.CO2
                || species == Species.H2O
                || species == Species.SO2
                || RARE_GASES.stream().anyMatch(rare -> rare.symbol().equals(species.name()));
    }

    /** {@return the moles of gas from the fuel itself, per kg of fuel, with or without its water} */
    static double burntMoles(Fuel fuel, boolean wet) {
        double moles = fuel.moles(Element.CARBON) + fuel.moles(Element.SULFUR) + fuel.moles(Element.NITROGEN) / 2;
        for (Element rare : RARE_GASES) {
            moles += fuel.moles(rare);
        }
        return wet ? moles + fuel.moles(Element.HYDROGEN) / 2 : moles;
    }

    /** {@return the fuel} */
    public Fuel fuel() {
        return fuel;
    }

    /** {@return the air that the fuel burnt with} */
    public IdealGas air() {
        return air;
    }

    /** {@return the excess over the stoichiometric air; 0.18 means 1.18 times the stoichiometric air} */
    public Ratio excessAir() {
        return Ratio.fraction(excess);
    }

    /** {@return the mass of air per mass of fuel} */
    public Ratio airPerFuel() {
        return Ratio.fraction(airPerFuel);
    }

    /** {@return the mass of air per mass of fuel that complete combustion takes without excess} */
    public Ratio stoichiometricAirPerFuel() {
        return Ratio.fraction(airPerFuel / (1 + excess));
    }

    /** {@return the mass of flue gas per mass of fuel: fuel without its ash, and air} */
    public Ratio gasPerFuel() {
        return Ratio.fraction(gasPerFuel);
    }

    /** {@return the composition without the water, as a gas analyser behind a cooler sees it} */
    public GasComposition dryComposition() {
        return composition().without(Species.H2O);
    }

    /** {@return the mole fraction of oxygen in the dry gas} */
    public Ratio oxygenInDryGas() {
        return dryComposition().moleFraction(Species.O2);
    }

    /** {@return the mole fraction of oxygen in the wet gas} */
    public Ratio oxygenInWetGas() {
        return composition().moleFraction(Species.O2);
    }

    /**
     * {@return the temperature that the flue gas reaches when no heat is lost, fuel at 298.15 K, combustion complete}
     *
     * @param airTemperature the temperature of the air
     * @throws OutOfRangeException if the temperature lies outside the range of air or flue gas
     */
    public Temperature adiabaticFlameTemperature(Temperature airTemperature) {
        return flame(fuel.enthalpy(), airTemperature);
    }

    /**
     * {@return the temperature that the flue gas reaches when no heat is lost, combustion complete}
     *
     * @param fuelTemperature the temperature of the gaseous fuel
     * @param airTemperature the temperature of the air
     * @throws IllegalStateException if the fuel is liquid or solid: its heat capacity is not known here
     * @throws OutOfRangeException if a temperature lies outside the range of fuel, air or flue gas
     */
    public Temperature adiabaticFlameTemperature(Temperature fuelTemperature, Temperature airTemperature) {
        final IdealGas gas = fuel.asGas()
                .orElseThrow(() -> new IllegalStateException("the heat capacity of " + fuel.name()
                        + " is not known; use adiabaticFlameTemperature(air) with the fuel at 298.15 K"));
        return flame(enthalpy(gas, fuelTemperature), airTemperature);
    }

    private Temperature flame(double fuelEnthalpy, Temperature airTemperature) {
        final double given = fuelEnthalpy + airPerFuel * enthalpy(air, airTemperature);
        return Temperature.kelvin(((IdealGasModel) model()).temperatureAtEnthalpy(given / gasPerFuel));
    }

    private static double enthalpy(IdealGas gas, Temperature temperature) {
        gas.model().range().requireTemperature(temperature.si());
        return ((IdealGasModel) gas.model()).curve().enthalpy(temperature.si());
    }
}
