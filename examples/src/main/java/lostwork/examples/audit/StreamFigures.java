package lostwork.examples.audit;

import java.util.List;
import java.util.Optional;
import lostwork.quantity.Energy;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * The figures of one stream.
 *
 * @param stream the line of the survey
 * @param mediumLabel the medium in words, with what the model found about it
 * @param massFlow the mass flow, water vapour included
 * @param lowestCounted the temperature that heat and work are counted to: the lowest allowed or the ambient, whichever
 *     is higher
 * @param exergyAtSupply flow exergy at the supply state against the ambient; empty where the model does not reach it
 * @param heat heat rejected between the supply temperature and the lowest counted
 * @param mostWork reversible work on that way, the difference of the flow exergies
 * @param likelyWork endoreversible work on that way
 * @param notes what a reader must know about this stream
 */
record StreamFigures(
        SurveyLine stream,
        String mediumLabel,
        MassFlow massFlow,
        Temperature lowestCounted,
        Optional<Power> exergyAtSupply,
        Estimate heat,
        Estimate mostWork,
        Estimate likelyWork,
        List<String> notes) {
    StreamFigures {
        notes = List.copyOf(notes);
    }

    /** {@return whether the stream has heat to give above the ambient and its lowest temperature} */
    boolean hasHeat() {
        return heat.value().si() > 0;
    }

    /** {@return the mean exergetic quality of the heat, work over heat; empty where there is no heat} */
    Optional<Ratio> quality() {
        return hasHeat() ? Optional.of(mostWork.value().over(heat.value())) : Optional.empty();
    }

    Energy heatPerYear() {
        return stream.hoursPerYear().times(heat.value());
    }

    Energy likelyWorkPerYear() {
        return stream.hoursPerYear().times(likelyWork.value());
    }

    Energy likelyWorkPerYearLow() {
        return stream.hoursPerYear().times(likelyWork.low());
    }

    Energy likelyWorkPerYearHigh() {
        return stream.hoursPerYear().times(likelyWork.high());
    }
}
