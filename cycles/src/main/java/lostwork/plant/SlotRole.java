package lostwork.plant;

/** What a slot of the plant is to the solver. */
enum SlotRole {
    PRESSURE,
    ENTHALPY,
    TEMPERATURE,
    ENTROPY,
    VOLUME,
    VAPOUR_FRACTION,
    SUPERHEAT,
    SUBCOOLING,
    FLOW,
    /** Powers, heat rates, reservoir temperatures and the variables of components. */
    OTHER;

    /** The roles of the properties of a state, in the order of their slots. */
    static final SlotRole[] OF_STATE = {
        PRESSURE, ENTHALPY, TEMPERATURE, ENTROPY, VOLUME, VAPOUR_FRACTION, SUPERHEAT, SUBCOOLING
    };
}
