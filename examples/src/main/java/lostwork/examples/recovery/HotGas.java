package lostwork.examples.recovery;

import lostwork.fluid.Fluid;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;

/**
 * A stream of hot gas that may be cooled.
 *
 * @param name its name
 * @param fluid what it consists of
 * @param flow the mass flow
 * @param supply the temperature with which it comes
 * @param lowest the temperature below which it must not be cooled
 * @param pressure its absolute pressure
 * @param expectedWork about how much work a plant may give; it settles the class of the machines to start with
 */
public record HotGas(
        String name,
        Fluid fluid,
        MassFlow flow,
        Temperature supply,
        Temperature lowest,
        Pressure pressure,
        Power expectedWork) {}
