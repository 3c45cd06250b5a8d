package lostwork.plant;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import lostwork.quantity.EntropyRate;

/**
 * How well the balances of a solution close, component by component, from the values at the ports alone: an
 * evidence that does not use the equations that were solved. Immutable.
 */
public final class Closure {
    private final double mass;
    private final double energy;
    private final Map<Component, EntropyRate> generation;

    private Closure(double mass, double energy, Map<Component, EntropyRate> generation) {
        this.mass = mass;
        this.energy = energy;
        this.generation = generation;
    }

    static Closure of(Solution solution) {
        double mass = 0;
        double energy = 0;
        double largestFlow = 0;
        double largestPower = 0;
        final Map<Component, EntropyRate> generation = new LinkedHashMap<>();
        for (Component component : solution.plant().components()) {
            double massGap = 0;
            double energyGap = 0;
            for (Port port : component.ports()) {
                if (port instanceof MaterialPort material) {
                    final double sign = port.isInlet() ? 1 : -1;
                    final double flow = si(solution, material.flow());
                    final double power = flow * si(solution, material.enthalpy());
                    massGap += sign * flow;
                    energyGap += sign * power;
                    largestFlow = Math.max(largestFlow, Math.abs(flow));
                    largestPower = Math.max(largestPower, Math.abs(power));
                } else {
                    final double power = signedPower(solution, port);
                    energyGap += power;
                    largestPower = Math.max(largestPower, Math.abs(power));
                }
            }
            final boolean boundary = component.isBoundary();
            if (!boundary) {
                mass = Math.max(mass, Math.abs(massGap));
                energy = Math.max(energy, Math.abs(energyGap));
                generation.put(component, EntropyRate.wattsPerKelvin(entropyGeneration(solution, component)));
            }
        }
        return new Closure(
                largestFlow > 0 ? mass / largestFlow : 0, largestPower > 0 ? energy / largestPower : 0, generation);
    }

    /** Power into the component through a port that is not one of matter. */
    private static double signedPower(Solution solution, Port port) {
        final double sign = port.isInlet() ? 1 : -1;
        if (port instanceof ShaftPort shaft) {
            return sign * si(solution, shaft.power());
        }
        if (port instanceof WirePort wire) {
            return sign * si(solution, wire.power());
        }
        return sign * si(solution, ((HeatPort) port).rate());
    }

    static double entropyGeneration(Solution solution, Component component) {
        double generation = 0;
        for (Port port : component.ports()) {
            double flow = 0;
            if (port instanceof MaterialPort material) {
                flow = (port.isInlet() ? -1 : 1) * si(solution, material.flow()) * si(solution, material.entropy());
            } else if (port instanceof HeatPort heat) {
                final double temperature = si(solution, heat.temperature());
                if (!Double.isNaN(temperature)) {
                    flow = -signedPower(solution, port) / temperature;
                }
            }
            generation += flow;
        }
        return generation;
    }

    private static double si(Solution solution, Variable<?> variable) {
        return solution.si(solution.plant().slotOf(variable));
    }

    /** {@return the largest gap of a mass balance, against the largest mass flow} */
    public double mass() {
        return mass;
    }

    /** {@return the largest gap of an energy balance, against the largest energy flow} */
    public double energy() {
        return energy;
    }

    /** {@return the entropy that each component generates, supplies and discharges left out} */
    public Map<Component, EntropyRate> entropyGeneration() {
        return Collections.unmodifiableMap(generation);
    }
}
