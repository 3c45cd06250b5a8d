package lostwork.plant.kernel;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Orders a square system into blocks that can be solved one after the other: the strongly connected components of its
 * equations (Tarjan, SIAM Journal on Computing 1 (1972) 146–160), each after those that it needs.
 */
public final class Blocks {
    private Blocks() {}

    /**
     * {@return the blocks in the order of solving, each as the ascending list of its equations}
     *
     * @param unknownsOf for each equation the unknowns that occur in it
     * @param equations the equations that take part, each matched
     * @param matching the matching
     */
    public static List<int[]> order(int[][] unknownsOf, int[] equations, Matching matching) {
        return new Search(unknownsOf, matching).run(equations);
    }

    /** Tarjan's search with an explicit stack, so that long chains do not overflow the call stack. */
    private static final class Search {
        private final int[][] unknownsOf;
        private final Matching matching;
        private final int[] number;
        private final int[] low;
        private final boolean[] open;
        private final int[] path;
        private final List<int[]> blocks = new ArrayList<>();
        private int counter;
        private int pathLength;

        Search(int[][] unknownsOf, Matching matching) {
            this.unknownsOf = unknownsOf;
            this.matching = matching;
            number = new int[unknownsOf.length];
            low = new int[unknownsOf.length];
            open = new boolean[unknownsOf.length];
            path = new int[unknownsOf.length];
        }

        List<int[]> run(int[] equations) {
            final int[] frame = new int[unknownsOf.length];
            final int[] next = new int[unknownsOf.length];
            for (int start : equations) {
                if (number[start] != 0) {
                    continue;
                }
                int depth = 0;
                frame[0] = start;
                enter(start);
                next[start] = 0;
                while (depth >= 0) {
                    final int equation = frame[depth];
                    if (next[equation] < unknownsOf[equation].length) {
                        final int needed = matching.equationOf(unknownsOf[equation][next[equation]++]);
                        if (needed < 0 || needed == equation) {
                            continue;
                        }
                        if (number[needed] == 0) {
                            enter(needed);
                            next[needed] = 0;
                            frame[++depth] = needed;
                        } else if (open[needed]) {
                            low[equation] = Math.min(low[equation], number[needed]);
                        }
                    } else {
                        leave(equation);
                        depth--;
                        if (depth >= 0) {
                            low[frame[depth]] = Math.min(low[frame[depth]], low[equation]);
                        }
                    }
                }
            }
            return blocks;
        }

        private void enter(int equation) {
            counter++;
            number[equation] = counter;
            low[equation] = counter;
            open[equation] = true;
            path[pathLength++] = equation;
        }

        private void leave(int equation) {
            if (low[equation] != number[equation]) {
                return;
            }
            final int end = pathLength;
            int member;
            do {
                member = path[--pathLength];
                open[member] = false;
            } while (member != equation);
            final int[] block = Arrays.copyOfRange(path, pathLength, end);
            Arrays.sort(block);
            blocks.add(block);
        }
    }
}
