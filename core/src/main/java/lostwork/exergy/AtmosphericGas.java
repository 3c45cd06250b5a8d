package lostwork.exergy;

/** A gas of the atmosphere that can be part of a reference environment. */
public enum AtmosphericGas {
    /** Nitrogen, N2. */
    NITROGEN("N2"),
    /** Oxygen, O2. */
    OXYGEN("O2"),
    /** Argon, Ar. */
    ARGON("Ar"),
    /** Carbon dioxide, CO2. */
    CARBON_DIOXIDE("CO2"),
    /** Water vapour, H2O. */
    WATER("H2O"),
    /** Neon, Ne. */
    NEON("Ne"),
    /** Helium, He. */
    HELIUM("He"),
    /** Krypton, Kr. */
    KRYPTON("Kr"),
    /** Xenon, Xe. */
    XENON("Xe");

    private final String formula;

    AtmosphericGas(String formula) {
        this.formula = formula;
    }

    /** {@return the chemical formula, such as {@code "CO2"}} */
    public String formula() {
        return formula;
    }
}
