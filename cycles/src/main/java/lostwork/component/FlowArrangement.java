package lostwork.component;

/** How the two streams of an exchanger run past each other. */
public enum FlowArrangement {
    /** Against each other: the hot stream enters where the cold one leaves. */
    COUNTERFLOW,
    /** Side by side: both streams enter at the same end. */
    PARALLEL_FLOW
}
