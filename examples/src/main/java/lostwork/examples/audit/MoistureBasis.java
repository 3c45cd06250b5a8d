package lostwork.examples.audit;

/** Whether a gas quantity counts the water vapour in the gas. */
enum MoistureBasis {
    /** The gas as it flows, water vapour included. */
    WET,
    /** The gas without its water vapour. */
    DRY
}
