package lostwork.fluid.gas;

import lostwork.quantity.OutOfRangeException;

/**
 * The share of one species in the moles of a gas: one entry of an analysis.
 *
 * <p>The factories are made for static import: {@code GasComposition.of(methane(0.93), ethane(0.04), nitrogen(0.03))}.
 * All take parts of one, 0 to 1. Immutable and thread-safe.
 */
public final class MoleFraction {
    private final Species species;
    private final double fraction;

    private MoleFraction(Species species, double fraction) {
        if (!(fraction >= 0 && fraction <= 1)) {
            throw new OutOfRangeException(
                    "mole fraction of " + species.name(), fraction, 0, 1, "1", "a share of a mixture", "");
        }
        this.species = species;
        this.fraction = fraction;
    }

    /**
     * {@return the share of a species}
     *
     * @param species the species
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction of(Species species, double fraction) {
        return new MoleFraction(species, fraction);
    }

    /**
     * {@return a share of methane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction methane(double fraction) {
        return of(Species.of("CH4"), fraction);
    }

    /**
     * {@return a share of ethane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction ethane(double fraction) {
        return of(Species.of("C2H6"), fraction);
    }

    /**
     * {@return a share of propane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction propane(double fraction) {
        return of(Species.of("C3H8"), fraction);
    }

    /**
     * {@return a share of n-butane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction butane(double fraction) {
        return of(Species.of("n-C4H10"), fraction);
    }

    /**
     * {@return a share of isobutane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction isobutane(double fraction) {
        return of(Species.of("iso-C4H10"), fraction);
    }

    /**
     * {@return a share of n-pentane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction pentane(double fraction) {
        return of(Species.of("n-C5H12"), fraction);
    }

    /**
     * {@return a share of n-hexane}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction hexane(double fraction) {
        return of(Species.of("n-C6H14"), fraction);
    }

    /**
     * {@return a share of ethylene}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction ethylene(double fraction) {
        return of(Species.of("C2H4"), fraction);
    }

    /**
     * {@return a share of propylene}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction propylene(double fraction) {
        return of(Species.of("C3H6"), fraction);
    }

    /**
     * {@return a share of hydrogen}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction hydrogen(double fraction) {
        return of(Species.of("H2"), fraction);
    }

    /**
     * {@return a share of carbon monoxide}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction carbonMonoxide(double fraction) {
        return of(Species.of("CO"), fraction);
    }

    /**
     * {@return a share of carbon dioxide}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction carbonDioxide(double fraction) {
        return of(Species.of("CO2"), fraction);
    }

    /**
     * {@return a share of nitrogen}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction nitrogen(double fraction) {
        return of(Species.of("N2"), fraction);
    }

    /**
     * {@return a share of oxygen}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction oxygen(double fraction) {
        return of(Species.of("O2"), fraction);
    }

    /**
     * {@return a share of argon}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction argon(double fraction) {
        return of(Species.of("Ar"), fraction);
    }

    /**
     * {@return a share of helium}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction helium(double fraction) {
        return of(Species.of("He"), fraction);
    }

    /**
     * {@return a share of water vapour}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction waterVapour(double fraction) {
        return of(Species.of("H2O"), fraction);
    }

    /**
     * {@return a share of hydrogen sulfide}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction hydrogenSulfide(double fraction) {
        return of(Species.of("H2S"), fraction);
    }

    /**
     * {@return a share of sulfur dioxide}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction sulfurDioxide(double fraction) {
        return of(Species.of("SO2"), fraction);
    }

    /**
     * {@return a share of ammonia}
     *
     * @param fraction parts of one, 0 to 1
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static MoleFraction ammonia(double fraction) {
        return of(Species.of("NH3"), fraction);
    }

    /** {@return the species} */
    public Species species() {
        return species;
    }

    /** {@return the share in parts of one} */
    public double fraction() {
        return fraction;
    }

    /** {@return the name and the share, such as {@code CH4 0.93}} */
    @Override
    public String toString() {
        return species.name() + " " + fraction;
    }
}
