package lostwork.examples.audit;

import lostwork.examples.recovery.Recovery;
import lostwork.quantity.Energy;

/**
 * A recovery plant on a stream of the survey.
 *
 * @param figures the figures of the stream
 * @param recovery the plant
 * @param net its net power, with the range that flow and supply temperature of the stream give it
 */
record RecoveryProposal(StreamFigures figures, Recovery recovery, Estimate net) {
    static RecoveryProposal of(StreamFigures figures, Recovery recovery) {
        final SurveyLine stream = figures.stream();
        return new RecoveryProposal(
                figures,
                recovery,
                new Estimate(
                        recovery.netPower(),
                        recovery.uncertainty(stream.flowUncertainty(), stream.temperatureUncertainty())));
    }

    Energy perYear() {
        return figures.stream().hoursPerYear().times(net.value());
    }

    Energy perYearLow() {
        return figures.stream().hoursPerYear().times(net.low());
    }

    Energy perYearHigh() {
        return figures.stream().hoursPerYear().times(net.high());
    }
}
