package lostwork.plant.kernel;

/** Gives start values to the unknowns of a block from what is already known. */
@FunctionalInterface
public interface StartValues {
    /**
     * Sets a start value for each unknown of a block.
     *
     * @param slots the unknown slots of the block
     * @param known for each slot of the plant whether its value is already settled
     * @param workspace holds the values, and takes the start values
     */
    void prepare(int[] slots, boolean[] known, Workspace workspace);
}
