package lostwork.examples.audit;

import java.util.List;
import java.util.Optional;

/**
 * What came of looking for a recovery plant.
 *
 * @param proposal the plant; empty where no stream is suitable
 * @param passedOver why the streams that rank higher have no plant, or why none has one, in sentences
 */
record RecoveryOutcome(Optional<RecoveryProposal> proposal, List<String> passedOver) {
    RecoveryOutcome {
        passedOver = List.copyOf(passedOver);
    }
}
