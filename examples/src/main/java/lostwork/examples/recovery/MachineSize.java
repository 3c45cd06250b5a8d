package lostwork.examples.recovery;

import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/** Size classes of steam turbine sets; small machines lose more. */
public enum MachineSize {
    /** Single-stage turbines. */
    BELOW_HALF_A_MEGAWATT("below 0.5 MW", 0, 50, "35 % to 60 %, single stage", 93.5, "92 % to 95.5 %"),
    /** Small multistage turbines. */
    UP_TO_TWO_MEGAWATTS("0.5 MW to 2 MW", 0.5, 65, "55 % to 70 %", 96.0, "95.5 % to 97.5 %"),
    /** Multistage turbines. */
    UP_TO_TEN_MEGAWATTS("2 MW to 10 MW", 2, 75, "68 % to 80 %", 96.5, "95.5 % to 98.5 %"),
    /** Large industrial turbines. */
    ABOVE_TEN_MEGAWATTS("above 10 MW", 10, 82, "78 % to 86 %", 97.5, "97 % to 98.5 %");

    private static final String PRACTICE = "common practice, no source";

    private final String words;
    private final Power from;
    private final Assumption<Ratio> turbineEfficiency;
    private final Assumption<Ratio> generatorEfficiency;

    MachineSize(
            String words,
            double fromMegawatts,
            double turbinePercent,
            String turbineRange,
            double generatorPercent,
            String generatorRange) {
        this.words = words;
        this.from = Power.megawatts(fromMegawatts);
        this.turbineEfficiency = new Assumption<>(
                "turbine isentropic efficiency",
                Ratio.percent(turbinePercent),
                turbineRange + " for " + words + ": " + PRACTICE);
        this.generatorEfficiency = new Assumption<>(
                "generator efficiency",
                Ratio.percent(generatorPercent),
                generatorRange + " for " + words + ": " + PRACTICE);
    }

    /** {@return the class of a turbine} */
    static MachineSize of(Power shaftPower) {
        MachineSize size = BELOW_HALF_A_MEGAWATT;
        for (MachineSize larger : values()) {
            if (shaftPower.compareTo(larger.from) >= 0) {
                size = larger;
            }
        }
        return size;
    }

    /** {@return the class in words} */
    public String words() {
        return words;
    }

    /** {@return the isentropic efficiency of the turbine; moisture included} */
    public Assumption<Ratio> turbineEfficiency() {
        return turbineEfficiency;
    }

    /** {@return the efficiency of the generator} */
    public Assumption<Ratio> generatorEfficiency() {
        return generatorEfficiency;
    }
}
