package lostwork.plant.kernel;

import java.util.Arrays;

/**
 * A maximum matching of equations with unknowns, and what it tells about the structure (Dulmage and Mendelsohn,
 * Canadian Journal of Mathematics 10 (1958) 517–534).
 *
 * <p>Equations are tried in their order, so that earlier ones keep their place when there are too many; the result does
 * not depend on anything else. Mutable while equations are added, private to one planning.
 */
public final class Matching {
    private static final int NONE = -1;

    private final int[][] unknownsOf;
    private final int[] unknownOf;
    private final int[] equationOf;
    private final int[] visitedAt;
    /** The alternating path that is searched, as an explicit stack: long chains do not overflow the call stack. */
    private final int[] path;
    /** For each equation of the path, how many of its unknowns have been looked at. */
    private final int[] cursor;
    /** For each equation of the path, the unknown that leads to the next one. */
    private final int[] taken;

    private int visit;

    /**
     * Creates an empty matching.
     *
     * @param unknownsOf for each equation the unknowns that occur in it
     * @param unknowns how many unknowns there are
     */
    public Matching(int[][] unknownsOf, int unknowns) {
        this.unknownsOf = unknownsOf;
        unknownOf = new int[unknownsOf.length];
        equationOf = new int[unknowns];
        visitedAt = new int[unknowns];
        path = new int[unknowns + 1];
        cursor = new int[unknowns + 1];
        taken = new int[unknowns + 1];
        Arrays.fill(unknownOf, NONE);
        Arrays.fill(equationOf, NONE);
    }

    /**
     * Tries to match one more equation, rearranging the others where needed.
     *
     * @param equation the equation
     * @return whether it found an unknown
     */
    public boolean add(int equation) {
        visit++;
        int depth = 0;
        path[0] = equation;
        cursor[0] = 0;
        while (depth >= 0) {
            final int free = cursor[depth] == 0 ? freeUnknown(path[depth]) : NONE;
            if (free != NONE) {
                match(path[depth], free);
                while (--depth >= 0) {
                    match(path[depth], taken[depth]);
                }
                return true;
            }
            final int next = unvisitedUnknown(path[depth], depth);
            if (next == NONE) {
                depth--;
            } else {
                visitedAt[next] = visit;
                taken[depth++] = next;
                path[depth] = equationOf[next];
                cursor[depth] = 0;
            }
        }
        return false;
    }

    private int freeUnknown(int equation) {
        for (int unknown : unknownsOf[equation]) {
            if (equationOf[unknown] == NONE) {
                return unknown;
            }
        }
        return NONE;
    }

    private int unvisitedUnknown(int equation, int depth) {
        while (cursor[depth] < unknownsOf[equation].length) {
            final int unknown = unknownsOf[equation][cursor[depth]++];
            if (visitedAt[unknown] != visit) {
                return unknown;
            }
        }
        return NONE;
    }

    /**
     * Takes an equation out, so that its unknown is free for another one.
     *
     * @param equation an equation that is matched
     */
    public void remove(int equation) {
        equationOf[unknownOf[equation]] = NONE;
        unknownOf[equation] = NONE;
    }

    private void match(int equation, int unknown) {
        equationOf[unknown] = equation;
        unknownOf[equation] = unknown;
    }

    /**
     * {@return the unknown that an equation is matched with, negative for none}
     *
     * @param equation the equation
     */
    public int unknownOf(int equation) {
        return unknownOf[equation];
    }

    /**
     * {@return the equation that an unknown is matched with, negative for none}
     *
     * @param unknown the unknown
     */
    public int equationOf(int unknown) {
        return equationOf[unknown];
    }

    /**
     * {@return the under-determined part: for each unknown whether giving a value for it would settle an unmatched one}
     *
     * <p>These are the unknowns that an alternating path joins to an unmatched unknown.
     *
     * @param seeds the unmatched unknowns to start from
     */
    public boolean[] underdetermined(int... seeds) {
        final boolean[] reached = new boolean[equationOf.length];
        final boolean[] passed = new boolean[unknownsOf.length];
        final int[][] equationsOf = equationsOf();
        final int[] stack = new int[equationOf.length];
        int depth = 0;
        for (int seed : seeds) {
            if (!reached[seed]) {
                reached[seed] = true;
                stack[depth++] = seed;
            }
        }
        while (depth > 0) {
            final int unknown = stack[--depth];
            for (int equation : equationsOf[unknown]) {
                if (!passed[equation] && unknownOf[equation] != NONE) {
                    passed[equation] = true;
                    final int next = unknownOf[equation];
                    if (!reached[next]) {
                        reached[next] = true;
                        stack[depth++] = next;
                    }
                }
            }
        }
        return reached;
    }

    /**
     * {@return the over-determined part around an unmatched equation: for each equation whether dropping it would make
     * room}
     *
     * @param seed the unmatched equation to start from
     */
    public boolean[] overdetermined(int seed) {
        final boolean[] reached = new boolean[unknownsOf.length];
        final int[] stack = new int[unknownsOf.length];
        int depth = 0;
        reached[seed] = true;
        stack[depth++] = seed;
        while (depth > 0) {
            for (int unknown : unknownsOf[stack[--depth]]) {
                final int next = equationOf[unknown];
                if (next != NONE && !reached[next]) {
                    reached[next] = true;
                    stack[depth++] = next;
                }
            }
        }
        return reached;
    }

    private int[][] equationsOf() {
        final int[] count = new int[equationOf.length];
        for (int[] unknowns : unknownsOf) {
            for (int unknown : unknowns) {
                count[unknown]++;
            }
        }
        final int[][] result = new int[equationOf.length][];
        for (int unknown = 0; unknown < result.length; unknown++) {
            result[unknown] = new int[count[unknown]];
        }
        for (int equation = unknownsOf.length - 1; equation >= 0; equation--) {
            for (int unknown : unknownsOf[equation]) {
                result[unknown][--count[unknown]] = equation;
            }
        }
        return result;
    }
}
