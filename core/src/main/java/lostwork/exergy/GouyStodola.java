package lostwork.exergy;

import lostwork.quantity.Energy;
import lostwork.quantity.Entropy;
import lostwork.quantity.EntropyRate;
import lostwork.quantity.Power;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;

/**
 * The theorem that gives this library its name: the work lost by a process is the ambient temperature times the entropy it
 * generates, {@code W_lost = T0 S_gen}.
 *
 * <p>The lost work is the exergy that is destroyed. A negative entropy generation, as unreconciled measurements may show,
 * comes back as a negative lost work: it is a finding about the data, and it is not hidden.
 *
 * <p>Sources: M. Gouy, Sur l'énergie utilisable, Journal de Physique 8 (1889) 501-518; A. Stodola, Die Dampfturbinen,
 * Springer 1905 and later editions.
 */
public final class GouyStodola {
    private GouyStodola() {}

    /**
     * {@return the power lost}
     *
     * @param generation the entropy generated per time
     * @param environment the environment against which the work counts
     */
    public static Power lostPower(EntropyRate generation, ReferenceEnvironment environment) {
        return generation.times(environment.temperature());
    }

    /**
     * {@return the work lost}
     *
     * @param generation the entropy generated
     * @param environment the environment against which the work counts
     */
    public static Energy lostWork(Entropy generation, ReferenceEnvironment environment) {
        return generation.times(environment.temperature());
    }

    /**
     * {@return the work lost per mass}
     *
     * @param generation the entropy generated per mass
     * @param environment the environment against which the work counts
     */
    public static SpecificEnergy lostWork(SpecificEntropy generation, ReferenceEnvironment environment) {
        return generation.times(environment.temperature());
    }
}
