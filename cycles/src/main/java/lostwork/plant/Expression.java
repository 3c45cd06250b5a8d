package lostwork.plant;

import java.util.List;
import java.util.function.Consumer;
import lostwork.plant.kernel.Tape;
import lostwork.quantity.Dimension;
import lostwork.quantity.ScalarQuantity;

/**
 * A term of an equation: a variable, a constant, or an operation on terms.
 *
 * <p>A component builds each of its equations once from such terms. Which variables occur in it, its value, its exact
 * derivatives and its printed text all follow. Dimensions are checked when a term is built: a sum of a power and a mass
 * flow is refused at once. Immutable and thread-safe.
 */
public abstract class Expression {
    private final Dimension dimension;

    Expression(Dimension dimension) {
        this.dimension = dimension;
    }

    /** {@return the dimension of the term} */
    public final Dimension dimension() {
        return dimension;
    }

    /**
     * {@return a constant}
     *
     * @param value the value
     */
    public static Expression constant(ScalarQuantity<?, ?> value) {
        return new Constant(value.si(), value.kind().dimension(), value.toString());
    }

    /**
     * {@return a plain number}
     *
     * @param value the number, finite
     */
    public static Expression number(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("number = " + value + " must be finite");
        }
        return new Constant(value, Dimension.ONE, Double.toString(value));
    }

    /**
     * {@return the sum of this term and another}
     *
     * @param other a term of the same dimension
     * @throws IllegalArgumentException if the dimensions differ
     */
    public final Expression plus(Expression other) {
        return new Binary(Operation.PLUS, this, other, sameDimension(other, "+"));
    }

    /**
     * {@return this term less another}
     *
     * @param other a term of the same dimension
     * @throws IllegalArgumentException if the dimensions differ
     */
    public final Expression minus(Expression other) {
        return new Binary(Operation.MINUS, this, other, sameDimension(other, "−"));
    }

    /**
     * {@return the product of this term and another}
     *
     * @param other the other factor
     */
    public final Expression times(Expression other) {
        return new Binary(Operation.TIMES, this, other, dimension.times(other.dimension));
    }

    /**
     * {@return the quotient of this term and another}
     *
     * @param other the divisor
     */
    public final Expression over(Expression other) {
        return new Binary(Operation.OVER, this, other, dimension.dividedBy(other.dimension));
    }

    /**
     * {@return a power of this term}
     *
     * @param exponent the constant exponent
     * @throws IllegalArgumentException if this term has a dimension
     */
    public final Expression power(double exponent) {
        return new Power(requireNumber("power"), exponent);
    }

    /**
     * {@return the natural logarithm of this term}
     *
     * @throws IllegalArgumentException if this term has a dimension
     */
    public final Expression logarithm() {
        return new Logarithm(requireNumber("logarithm"));
    }

    private Expression requireNumber(String operation) {
        if (!dimension.equals(Dimension.ONE)) {
            throw new IllegalArgumentException(
                    operation + " of " + this + ": it has the dimension " + dimension + ", a plain number is needed");
        }
        return this;
    }

    private Dimension sameDimension(Expression other, String sign) {
        if (!dimension.equals(other.dimension)) {
            throw new IllegalArgumentException("(" + this + ") " + sign + " (" + other + "): dimension " + dimension
                    + " does not match " + other.dimension);
        }
        return dimension;
    }

    /** Hands every variable of the term to a consumer. */
    abstract void forEachVariable(Consumer<Variable<?>> consumer);

    /** Writes the term to a tape and gives its node. */
    abstract int emit(Tape.Builder tape, Resolution resolution);

    /** Whether the text needs no parentheses inside a product. */
    boolean isFactor() {
        return true;
    }

    private static String factor(Expression e) {
        return e.isFactor() ? e.toString() : "(" + e + ")";
    }

    private static final class Constant extends Expression {
        private final double si;
        private final String text;

        Constant(double si, Dimension dimension, String text) {
            super(dimension);
            this.si = si;
            this.text = text;
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {}

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            return tape.constant(si);
        }

        @Override
        public String toString() {
            return text;
        }
    }

    private enum Operation {
        PLUS(" + "),
        MINUS(" − "),
        TIMES(" × "),
        OVER(" / ");

        private final String sign;

        Operation(String sign) {
            this.sign = sign;
        }
    }

    private static final class Binary extends Expression {
        private final Operation operation;
        private final Expression left;
        private final Expression right;

        Binary(Operation operation, Expression left, Expression right, Dimension dimension) {
            super(dimension);
            this.operation = operation;
            this.left = left;
            this.right = right;
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {
            left.forEachVariable(consumer);
            right.forEachVariable(consumer);
        }

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            final int a = left.emit(tape, resolution);
            final int b = right.emit(tape, resolution);
            return switch (operation) {
                case PLUS -> tape.plus(a, b);
                case MINUS -> tape.minus(a, b);
                case TIMES -> tape.times(a, b);
                case OVER -> tape.over(a, b);
            };
        }

        @Override
        boolean isFactor() {
            return operation == Operation.TIMES;
        }

        @Override
        public String toString() {
            return switch (operation) {
                case PLUS -> left + operation.sign + right;
                case MINUS -> left + operation.sign + (right.isFactor() ? right : "(" + right + ")");
                case TIMES -> factor(left) + operation.sign + factor(right);
                case OVER ->
                    factor(left) + operation.sign + (right instanceof Binary ? "(" + right + ")" : right.toString());
            };
        }
    }

    private static final class Power extends Expression {
        private final Expression base;
        private final double exponent;

        Power(Expression base, double exponent) {
            super(Dimension.ONE);
            this.base = base;
            this.exponent = exponent;
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {
            base.forEachVariable(consumer);
        }

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            return tape.power(base.emit(tape, resolution), exponent);
        }

        @Override
        public String toString() {
            return "(" + base + ")^" + exponent;
        }
    }

    private static final class Logarithm extends Expression {
        private final Expression argument;

        Logarithm(Expression argument) {
            super(Dimension.ONE);
            this.argument = argument;
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {
            argument.forEachVariable(consumer);
        }

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            return tape.logarithm(argument.emit(tape, resolution));
        }

        @Override
        public String toString() {
            return "ln(" + argument + ")";
        }
    }

    /** A property of the fluid at a port, as a function of other terms. */
    static final class Property extends Expression {
        private final FluidFunction function;
        private final MaterialPort port;
        private final List<Expression> arguments;

        Property(FluidFunction function, MaterialPort port, List<Expression> arguments) {
            super(function.result());
            this.function = function;
            this.port = port;
            this.arguments = arguments;
            for (int i = 0; i < arguments.size(); i++) {
                final Dimension given = arguments.get(i).dimension();
                final Dimension wanted = function.argument(i);
                if (!given.equals(wanted)) {
                    throw new IllegalArgumentException(function.words() + ": " + arguments.get(i)
                            + " has the dimension " + given + ", " + wanted + " is needed");
                }
            }
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {
            arguments.forEach(a -> a.forEachVariable(consumer));
        }

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            final int first = arguments.get(0).emit(tape, resolution);
            final int second = arguments.size() < 2 ? -1 : arguments.get(1).emit(tape, resolution);
            final int site = tape.callSites().property(resolution.modelAt(port), function.kind());
            return tape.property(site, first, second);
        }

        @Override
        public String toString() {
            return function.words() + " of " + port.component() + " fluid at " + arguments;
        }
    }

    /** A function of several terms and of the fluids at some ports. */
    static final class Function extends Expression {
        private final String words;
        private final FluidFunctionFactory factory;
        private final List<MaterialPort> ports;
        private final List<Expression> arguments;

        Function(
                String words,
                Dimension dimension,
                FluidFunctionFactory factory,
                List<MaterialPort> ports,
                List<Expression> arguments) {
            super(dimension);
            this.words = words;
            this.factory = factory;
            this.ports = ports;
            this.arguments = arguments;
        }

        @Override
        void forEachVariable(Consumer<Variable<?>> consumer) {
            arguments.forEach(a -> a.forEachVariable(consumer));
        }

        @Override
        int emit(Tape.Builder tape, Resolution resolution) {
            final int[] nodes =
                    arguments.stream().mapToInt(a -> a.emit(tape, resolution)).toArray();
            final var fluids = ports.stream().map(resolution::modelAt).toList();
            final int site = tape.callSites().function(() -> factory.create(fluids), nodes.length);
            return tape.function(site, nodes);
        }

        @Override
        public String toString() {
            return words + arguments;
        }
    }
}
