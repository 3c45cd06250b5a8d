package lostwork.examples.audit;

import java.util.Optional;
import lostwork.quantity.MassFlow;
import lostwork.quantity.MolarFlow;
import lostwork.quantity.NormalCondition;
import lostwork.quantity.VolumeFlow;

/** How much flows, as the survey states it. */
sealed interface SurveyFlow {
    /** {@return whether the flow is above zero} */
    boolean isPositive();

    /**
     * Mass per time, water vapour included.
     *
     * @param flow the flow
     */
    record ByMass(MassFlow flow) implements SurveyFlow {
        @Override
        public boolean isPositive() {
            return flow.si() > 0;
        }
    }

    /**
     * Gas volume counted at a normal condition.
     *
     * @param flow the flow, already as an amount of substance
     * @param condition the normal condition that it was counted at
     * @param basis whether water vapour is counted; empty when the survey does not say
     */
    record ByNormalVolume(MolarFlow flow, NormalCondition condition, Optional<MoistureBasis> basis)
            implements SurveyFlow {
        @Override
        public boolean isPositive() {
            return flow.si() > 0;
        }
    }

    /**
     * Volume at the supply temperature and pressure.
     *
     * @param flow the flow
     */
    record ByVolume(VolumeFlow flow) implements SurveyFlow {
        @Override
        public boolean isPositive() {
            return flow.si() > 0;
        }
    }
}
