package lostwork.plant.kernel;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import lostwork.fluid.FluidModel;
import lostwork.solve.DifferentiableFunction;

/**
 * The places where the equations of one system call property functions and user functions: what a {@link Workspace}
 * must hold. Filled while the system is compiled, then only read.
 */
public final class CallSites {
    /** A property function of one fluid; {@code state} groups the functions that share a flash, -1 for none. */
    record PropertySite(FluidModel model, PropertyKind kind, int state) {}

    /** A function of several arguments, made anew for each workspace since it may keep scratch values. */
    record FunctionSite(Supplier<DifferentiableFunction> factory, int arguments) {}

    private final List<PropertySite> properties = new ArrayList<>();
    private final List<FunctionSite> functions = new ArrayList<>();
    private final Map<PropertySite, Integer> ofStates = new LinkedHashMap<>();

    /** Creates an empty list. */
    public CallSites() {}

    /**
     * {@return the call site of a function of the pressure and enthalpy of a state; the same one each time}
     *
     * @param model the fluid
     * @param kind a function of pressure and enthalpy
     * @param state the index of the state
     */
    public int ofState(FluidModel model, PropertyKind kind, int state) {
        return ofStates.computeIfAbsent(new PropertySite(model, kind, state), site -> {
            properties.add(site);
            return properties.size() - 1;
        });
    }

    /**
     * {@return a new call site of a property function}
     *
     * @param model the fluid
     * @param kind the function
     */
    public int property(FluidModel model, PropertyKind kind) {
        properties.add(new PropertySite(model, kind, -1));
        return properties.size() - 1;
    }

    /**
     * {@return a new call site of a function of several arguments}
     *
     * @param factory makes the function for one workspace
     * @param arguments how many arguments it has
     */
    public int function(Supplier<DifferentiableFunction> factory, int arguments) {
        functions.add(new FunctionSite(factory, arguments));
        return functions.size() - 1;
    }

    List<PropertySite> properties() {
        return properties;
    }

    List<FunctionSite> functions() {
        return functions;
    }
}
