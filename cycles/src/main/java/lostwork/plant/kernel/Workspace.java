package lostwork.plant.kernel;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lostwork.fluid.StatePoint;
import lostwork.solve.DifferentiableFunction;

/** The values and scratch numbers of one solve; belongs to one thread at a time. */
public final class Workspace {
    /** The value of each slot in coherent SI units. */
    final double[] x;
    /** Values of the nodes of the tape evaluated last. */
    final double[] value;

    final double[] adjoint;
    final double[] byFirst;
    final double[] bySecond;
    /** The gradient of the equation evaluated last, by place of slot. */
    final double[] gradient;

    private final PropertyCall[] properties;
    private final DifferentiableFunction[] functions;
    private final double[][] functionArguments;
    private final double[][] functionGradients;

    /**
     * Creates a workspace.
     *
     * @param slots how many slots the system has
     * @param tapes all tapes that are evaluated on it
     * @param sites the call sites of the tapes
     */
    public Workspace(int slots, Iterable<Tape> tapes, CallSites sites) {
        int nodes = 0;
        int widest = 0;
        for (Tape tape : tapes) {
            nodes = Math.max(nodes, tape.nodes());
            widest = Math.max(widest, tape.size());
        }
        x = new double[slots];
        value = new double[nodes];
        adjoint = new double[nodes];
        byFirst = new double[nodes];
        bySecond = new double[nodes];
        gradient = new double[widest];
        final List<CallSites.PropertySite> calls = sites.properties();
        properties = new PropertyCall[calls.size()];
        final Map<Integer, PropertyCall.SharedState> states = new HashMap<>();
        final StatePoint liquid = new StatePoint();
        final StatePoint vapour = new StatePoint();
        for (int i = 0; i < properties.length; i++) {
            final CallSites.PropertySite site = calls.get(i);
            properties[i] = new PropertyCall(
                    site.model(),
                    site.kind(),
                    site.state() < 0
                            ? null
                            : states.computeIfAbsent(site.state(), k -> new PropertyCall.SharedState(site.model())),
                    liquid,
                    vapour);
        }
        final List<CallSites.FunctionSite> others = sites.functions();
        functions = new DifferentiableFunction[others.size()];
        functionArguments = new double[others.size()][];
        functionGradients = new double[others.size()][];
        for (int i = 0; i < functions.length; i++) {
            functions[i] = others.get(i).factory().get();
            functionArguments[i] = new double[others.get(i).arguments()];
            functionGradients[i] = new double[others.get(i).arguments()];
        }
    }

    /**
     * {@return the value of a slot in its coherent SI unit}
     *
     * @param slot the slot
     */
    public double get(int slot) {
        return x[slot];
    }

    /**
     * Sets the value of a slot.
     *
     * @param slot the slot
     * @param si the value in its coherent SI unit
     */
    public void set(int slot, double si) {
        x[slot] = si;
    }

    /** {@return a copy of the values of all slots} */
    public double[] copyOfValues() {
        return x.clone();
    }

    /**
     * {@return the value of a slot at which an equation holds that is affine in it; NaN when the equation does not settle
     * it}
     *
     * @param tape the equation
     * @param slot the slot
     */
    public double solveAffine(Tape tape, int slot) {
        final double residual = tape.evaluate(this);
        final int place = tape.placeOf(slot);
        final double solved = place < 0 ? Double.NaN : x[slot] - residual / gradient[place];
        return Double.isFinite(solved) ? solved : Double.NaN;
    }

    /**
     * Evaluates an equation and its gradient.
     *
     * @param tape the equation
     * @param derivatives takes the derivative of its residual with respect to each of its slots, by place
     * @return the residual
     */
    public double evaluate(Tape tape, double[] derivatives) {
        final double residual = tape.evaluate(this);
        System.arraycopy(gradient, 0, derivatives, 0, tape.size());
        return residual;
    }

    PropertyCall property(int site) {
        return properties[site];
    }

    boolean anyOutside() {
        for (PropertyCall call : properties) {
            if (call.outside()) {
                return true;
            }
        }
        return false;
    }

    double[] functionArguments(int site) {
        return functionArguments[site];
    }

    double[] functionGradient(int site) {
        return functionGradients[site];
    }

    double evaluateFunction(int site) {
        return functions[site].value(functionArguments[site], functionGradients[site]);
    }
}
