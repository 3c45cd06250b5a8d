package lostwork.plant.kernel;

import java.util.List;

/**
 * A square system of equations, ordered into blocks, ready to be solved. Immutable and shared between threads.
 *
 * @param equations the equations of the system
 * @param matched for each equation the slot that it is matched with
 * @param blocks the blocks in the order of solving, each as a list of equations
 * @param scales how each slot of the whole plant is judged
 * @param sites the call sites of the equations
 */
public record EquationSystem(
        List<Tape> equations, int[] matched, List<int[]> blocks, List<SlotScale> scales, CallSites sites) {
    /**
     * {@return a workspace for one solve}
     *
     * @param others further tapes that are to be evaluated on it
     */
    public Workspace workspace(List<Tape> others) {
        final java.util.ArrayList<Tape> all = new java.util.ArrayList<>(equations);
        all.addAll(others);
        return new Workspace(scales.size(), all, sites);
    }
}
