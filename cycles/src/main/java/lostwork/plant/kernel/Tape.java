package lostwork.plant.kernel;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * One equation {@code left = right} as a list of elementary operations: the residual left − right and its exact gradient
 * by one forward and one reverse sweep. Immutable; evaluated on a {@link Workspace}.
 */
public final class Tape {
    /** The elementary operations. */
    private enum Op {
        CONSTANT,
        SLOT,
        ADD,
        SUBTRACT,
        MULTIPLY,
        DIVIDE,
        POWER,
        LOGARITHM,
        PROPERTY,
        FUNCTION
    }

    private final Op[] ops;
    /** First operand of each operation: a node, or the slot for SLOT. */
    private final int[] first;
    /** Second operand: a node, or -1. */
    private final int[] second;
    /** Constant, exponent. */
    private final double[] constants;
    /** Call site of PROPERTY and FUNCTION in the workspace. */
    private final int[] sites;
    /** Operands of FUNCTION. */
    private final int[][] operands;
    /** The distinct slots of the equation, ascending. */
    private final int[] slots;
    /** For each slot its node. */
    private final int[] slotNodes;
    /** For each slot whether the residual is affine in it with all others fixed. */
    private final boolean[] affine;

    private final int left;
    private final int right;

    private Tape(Builder b, int left, int right) {
        final int n = b.ops.size();
        ops = b.ops.toArray(new Op[0]);
        first = new int[n];
        second = new int[n];
        constants = new double[n];
        sites = new int[n];
        operands = new int[n][];
        for (int i = 0; i < n; i++) {
            first[i] = b.first.get(i);
            second[i] = b.second.get(i);
            constants[i] = b.constants.get(i);
            sites[i] = b.sites.get(i);
            operands[i] = b.operands.get(i);
        }
        this.left = left;
        this.right = right;
        slots = b.slotNodes.keySet().stream()
                .mapToInt(Integer::intValue)
                .sorted()
                .toArray();
        slotNodes = Arrays.stream(slots).map(b.slotNodes::get).toArray();
        affine = new boolean[slots.length];
        for (int k = 0; k < slots.length; k++) {
            affine[k] = isAffine(slotNodes[k]);
        }
    }

    /** {@return how many slots the equation has} */
    public int size() {
        return slots.length;
    }

    /**
     * {@return a slot of the equation}
     *
     * @param k its place, 0 to size − 1; slots ascend
     */
    public int slot(int k) {
        return slots[k];
    }

    /**
     * {@return the place of a slot in this equation, negative when it does not occur}
     *
     * @param slot the slot
     */
    public int placeOf(int slot) {
        return Arrays.binarySearch(slots, slot);
    }

    /**
     * {@return whether the residual is affine in a slot with all others fixed}
     *
     * @param k the place of the slot
     */
    public boolean isAffineIn(int k) {
        return affine[k];
    }

    int nodes() {
        return ops.length;
    }

    /**
     * Evaluates the residual and its gradient; the gradient is left in the workspace, by place of slot.
     *
     * @param w the workspace that holds the values of all slots
     * @return left − right
     */
    double evaluate(Workspace w) {
        final double residual = forward(w);
        final double[] adjoint = w.adjoint;
        final int n = ops.length;
        Arrays.fill(adjoint, 0, n, 0.0);
        adjoint[left] += 1;
        adjoint[right] -= 1;
        for (int i = n - 1; i >= 0; i--) {
            final double seed = adjoint[i];
            if (seed == 0) {
                continue;
            }
            switch (ops[i]) {
                case CONSTANT, SLOT -> {}
                case FUNCTION -> {
                    final double[] gradient = w.functionGradient(sites[i]);
                    final int[] args = operands[i];
                    for (int k = 0; k < args.length; k++) {
                        adjoint[args[k]] += seed * gradient[k];
                    }
                }
                default -> {
                    adjoint[first[i]] += seed * w.byFirst[i];
                    if (second[i] >= 0) {
                        adjoint[second[i]] += seed * w.bySecond[i];
                    }
                }
            }
        }
        for (int k = 0; k < slots.length; k++) {
            w.gradient[k] = adjoint[slotNodes[k]];
        }
        return residual;
    }

    /**
     * Evaluates the residual alone.
     *
     * @param w the workspace that holds the values of all slots
     * @return left − right
     */
    double forward(Workspace w) {
        final double[] value = w.value;
        for (int i = 0; i < ops.length; i++) {
            switch (ops[i]) {
                case CONSTANT -> value[i] = constants[i];
                case SLOT -> value[i] = w.x[first[i]];
                case ADD -> {
                    value[i] = value[first[i]] + value[second[i]];
                    w.byFirst[i] = 1;
                    w.bySecond[i] = 1;
                }
                case SUBTRACT -> {
                    value[i] = value[first[i]] - value[second[i]];
                    w.byFirst[i] = 1;
                    w.bySecond[i] = -1;
                }
                case MULTIPLY -> {
                    final double a = value[first[i]];
                    final double b = value[second[i]];
                    value[i] = a * b;
                    w.byFirst[i] = b;
                    w.bySecond[i] = a;
                }
                case DIVIDE -> {
                    final double b = value[second[i]];
                    final double q = value[first[i]] / b;
                    value[i] = q;
                    w.byFirst[i] = 1 / b;
                    w.bySecond[i] = -q / b;
                }
                case POWER -> {
                    final double a = value[first[i]];
                    value[i] = Math.pow(a, constants[i]);
                    w.byFirst[i] = constants[i] * Math.pow(a, constants[i] - 1);
                }
                case LOGARITHM -> {
                    value[i] = Math.log(value[first[i]]);
                    w.byFirst[i] = 1 / value[first[i]];
                }
                case PROPERTY -> {
                    final PropertyCall call = w.property(sites[i]);
                    call.evaluate(value[first[i]], second[i] < 0 ? 0 : value[second[i]]);
                    value[i] = call.value();
                    w.byFirst[i] = call.byFirst();
                    w.bySecond[i] = call.bySecond();
                }
                case FUNCTION -> {
                    final int[] args = operands[i];
                    final double[] x = w.functionArguments(sites[i]);
                    for (int k = 0; k < args.length; k++) {
                        x[k] = value[args[k]];
                    }
                    value[i] = w.evaluateFunction(sites[i]);
                }
            }
        }
        return value[left] - value[right];
    }

    /**
     * {@return whether a property function of the equation lay outside the range of its fluid in its last evaluation}
     *
     * @param w the workspace that it was evaluated on
     */
    public boolean isOutside(Workspace w) {
        for (int i = 0; i < ops.length; i++) {
            if (ops[i] == Op.PROPERTY && w.property(sites[i]).outside()) {
                return true;
            }
        }
        return false;
    }

    /** {@return whether a property function of the equation could not tell liquid from vapour in its last evaluation} */
    boolean isAmbiguous(Workspace w) {
        for (int i = 0; i < ops.length; i++) {
            if (ops[i] == Op.PROPERTY && w.property(sites[i]).ambiguous()) {
                return true;
            }
        }
        return false;
    }

    private boolean isAffine(int slotNode) {
        // 0: does not depend on the slot, 1: affine in it, 2: anything else
        final int[] degree = new int[ops.length];
        for (int i = 0; i < ops.length; i++) {
            final int a = first[i] >= 0 && ops[i] != Op.SLOT ? degree[first[i]] : 0;
            final int b = second[i] >= 0 ? degree[second[i]] : 0;
            degree[i] = switch (ops[i]) {
                case CONSTANT -> 0;
                case SLOT -> i == slotNode ? 1 : 0;
                case ADD, SUBTRACT -> Math.max(a, b);
                case MULTIPLY -> Math.min(2, a + b);
                case DIVIDE -> b > 0 ? 2 : a;
                case POWER, LOGARITHM, PROPERTY -> a + b > 0 ? 2 : 0;
                case FUNCTION -> Arrays.stream(operands[i]).anyMatch(k -> degree[k] > 0) ? 2 : 0;
            };
        }
        return Math.max(degree[left], degree[right]) <= 1;
    }

    /** Builds a tape from the operands upwards; equal nodes are shared. */
    public static final class Builder {
        private final List<Op> ops = new ArrayList<>();
        private final List<Integer> first = new ArrayList<>();
        private final List<Integer> second = new ArrayList<>();
        private final List<Double> constants = new ArrayList<>();
        private final List<Integer> sites = new ArrayList<>();
        private final List<int[]> operands = new ArrayList<>();
        private final Map<Integer, Integer> slotNodes = new LinkedHashMap<>();
        private final Map<Object, Integer> shared = new LinkedHashMap<>();
        private final CallSites callSites;

        /**
         * Starts a tape.
         *
         * @param callSites the call sites of the system that the equation belongs to
         */
        public Builder(CallSites callSites) {
            this.callSites = callSites;
        }

        /**
         * {@return the node of a constant}
         *
         * @param value the constant
         */
        public int constant(double value) {
            return shared.computeIfAbsent(List.of(Op.CONSTANT, value), k -> add(Op.CONSTANT, -1, -1, value, -1, null));
        }

        /**
         * {@return the node of a slot}
         *
         * @param slot the slot
         */
        public int slot(int slot) {
            return slotNodes.computeIfAbsent(slot, k -> add(Op.SLOT, slot, -1, 0, -1, null));
        }

        /**
         * {@return the node of a sum}
         *
         * @param a a node
         * @param b a node
         */
        public int plus(int a, int b) {
            return binary(Op.ADD, a, b);
        }

        /**
         * {@return the node of a difference}
         *
         * @param a a node
         * @param b a node
         */
        public int minus(int a, int b) {
            return binary(Op.SUBTRACT, a, b);
        }

        /**
         * {@return the node of a product}
         *
         * @param a a node
         * @param b a node
         */
        public int times(int a, int b) {
            return binary(Op.MULTIPLY, a, b);
        }

        /**
         * {@return the node of a quotient}
         *
         * @param a a node
         * @param b a node
         */
        public int over(int a, int b) {
            return binary(Op.DIVIDE, a, b);
        }

        /**
         * {@return the node of a power}
         *
         * @param a a node
         * @param exponent the constant exponent
         */
        public int power(int a, double exponent) {
            return shared.computeIfAbsent(
                    List.of(Op.POWER, a, exponent), k -> add(Op.POWER, a, -1, exponent, -1, null));
        }

        /**
         * {@return the node of a natural logarithm}
         *
         * @param a a node
         */
        public int logarithm(int a) {
            return shared.computeIfAbsent(List.of(Op.LOGARITHM, a), k -> add(Op.LOGARITHM, a, -1, 0, -1, null));
        }

        /**
         * {@return the node of a property function}
         *
         * @param site the call site, from {@link CallSites#property}
         * @param a the node of the first argument
         * @param b the node of the second argument, -1 where there is none
         */
        public int property(int site, int a, int b) {
            return shared.computeIfAbsent(List.of(Op.PROPERTY, site, a, b), k -> add(Op.PROPERTY, a, b, 0, site, null));
        }

        /**
         * {@return the node of a function of several arguments}
         *
         * @param site the call site, from {@link CallSites#function}
         * @param args the nodes of the arguments
         */
        public int function(int site, int[] args) {
            return add(Op.FUNCTION, -1, -1, 0, site, args.clone());
        }

        /** {@return the call sites of the system} */
        public CallSites callSites() {
            return callSites;
        }

        /**
         * {@return the finished equation}
         *
         * @param left the node of the left side
         * @param right the node of the right side
         */
        public Tape build(int left, int right) {
            return new Tape(this, left, right);
        }

        private int binary(Op op, int a, int b) {
            return shared.computeIfAbsent(List.of(op, a, b), k -> add(op, a, b, 0, -1, null));
        }

        private int add(Op op, int a, int b, double constant, int site, int[] args) {
            ops.add(op);
            first.add(a);
            second.add(b);
            constants.add(constant);
            sites.add(site);
            operands.add(args == null ? new int[0] : args);
            return ops.size() - 1;
        }
    }
}
