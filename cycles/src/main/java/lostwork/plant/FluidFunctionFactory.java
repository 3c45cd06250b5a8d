package lostwork.plant;

import java.util.List;
import lostwork.fluid.FluidModel;
import lostwork.solve.DifferentiableFunction;

/**
 * Makes a function for use in an equation, once the fluids at some ports are known: for relations that no formula holds,
 * such as the smallest temperature difference inside an exchanger.
 */
@FunctionalInterface
public interface FluidFunctionFactory {
    /**
     * {@return a new function; it is used by one thread at a time and may keep scratch values}
     *
     * @param fluids the models of the fluids at the ports that the equation names, in their order
     */
    DifferentiableFunction create(List<FluidModel> fluids);
}
