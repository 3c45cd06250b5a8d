package lostwork.examples.audit;

/** The rules of the audit in words, with their sources, as every output repeats them. */
final class AuditRules {
    static final String HEAT = "Heat: what the stream gives off between its supply temperature and its lowest allowed"
            + " temperature, at its own pressure and without condensation; m (h1 - h2).";

    static final String MEDIUM =
            "Medium: air 1.61 means that 1.61 times the air of complete combustion burnt the fuel; g/kg"
                    + " is the mass of water vapour per mass of dry air.";

    static final String EXERGY =
            "Exergy: the flow exergy of the stream as it leaves, m (h1 - h0 - T0 (s1 - s0)), against"
                    + " the ambient of the site, composition kept. It counts what lies below the lowest allowed temperature too.";

    static final String MOST_WORK = "Most work: the reversible work of cooling the stream from supply to lowest allowed"
            + " temperature with the ambient as the only other partner, m (h1 - h2 - T0 (s1 - s2)), the difference of the"
            + " flow exergies. No machine gives more: second law (Gouy 1889, Stodola 1898).";

    static final String QUALITY = "Quality: most work over heat; the mean of 1 - T0/T over the heat.";

    static final String LIKELY_WORK = "Likely work: each slice of heat at its temperature T gives the share"
            + " 1 - sqrt(T0/T), the efficiency at most power of F. L. Curzon and B. Ahlborn, Am. J. Phys. 43 (1975) 22-24;"
            + " integrated along the cooling curve. For the three large power stations that the paper compares, the"
            + " observed efficiency was 0.90, 1.07 and 0.91 times this rule (figures from memory). Machines of a few"
            + " hundred kilowatts and below, and heat under about 150 °C, usually give less (common practice, no source).";

    static final String WORTH =
            "As power, or as heat: likely work at the power price, or all the heat at the heat price, if"
                    + " somebody takes it; one or the other, since the same heat does not do both. CO2 spared: likely work at the"
                    + " carbon intensity of the grid. Worth is not profit: no machine is paid for.";

    static final String UNCERTAINTY = "Range: flow and supply temperature are taken as independent; the half-width is"
            + " sqrt((W uf)^2 + (dW/dT1 uT)^2) after JCGM 100:2008 (GUM), 5.1.2, with the coverage of the uncertainties in"
            + " the survey. Composition, pressure and the likely-work rule itself are"
            + " not part of it.";

    static final String CAUTION = "Engineering estimates, not a design. Pressure equipment, steam and hot gas are"
            + " dangerous and fall under local codes; their design, installation and operation belong to licensed practice.";

    private AuditRules() {}
}
