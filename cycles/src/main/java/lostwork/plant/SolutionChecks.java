package lostwork.plant;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import lostwork.quantity.EntropyRate;

/**
 * What every solution is checked for: that no component destroys entropy, that values stay within their limits, and that
 * the requirements of the components are met. Compiled once for a plan; immutable and thread-safe.
 */
final class SolutionChecks {
    /** The share of the largest entropy flow below which a negative entropy generation is rounding. */
    private static final double ROUNDING = 1e-9;

    private static final int NONE = -1;

    /**
     * An entropy flow through a port: flow times entropy of matter, or rate over temperature of heat.
     *
     * @param sign 1 out of the component
     * @param first slot of the mass flow or the heat rate
     * @param entropy slot of the specific entropy, or {@link #NONE} for heat
     * @param temperature slot of the temperature of heat, or {@link #NONE} for matter
     */
    private record EntropyFlow(double sign, int first, int entropy, int temperature) {}

    private record Balance(String component, List<EntropyFlow> flows) {}

    private record Limit(Variable<?> variable, int slot) {}

    private final List<Balance> balances = new ArrayList<>();
    private final List<Limit> limits = new ArrayList<>();
    private final List<Equations.Requirement> requirements;

    SolutionChecks(SolvePlan plan) {
        final Plant plant = plan.plant();
        requirements = plant.requirements();
        final Set<Integer> flows = new HashSet<>();
        for (Component component : plant.components()) {
            if (!component.isBoundary()) {
                balances.add(balance(plant, component));
            }
            for (Variable<?> variable : component.variables()) {
                addLimit(plan, variable);
            }
            for (Port port : component.ports()) {
                if (port instanceof MaterialPort material && flows.add(plant.slotOf(material.flow()))) {
                    addLimit(plan, material.flow());
                }
            }
        }
    }

    private static Balance balance(Plant plant, Component component) {
        final List<EntropyFlow> flows = new ArrayList<>();
        for (Port port : component.ports()) {
            final double sign = port.isInlet() ? -1 : 1;
            if (port instanceof MaterialPort material) {
                flows.add(new EntropyFlow(sign, plant.slotOf(material.flow()), plant.slotOf(material.entropy()), NONE));
            } else if (port instanceof HeatPort heat) {
                flows.add(new EntropyFlow(sign, plant.slotOf(heat.rate()), NONE, plant.slotOf(heat.temperature())));
            }
        }
        return new Balance(component.name(), flows);
    }

    /** Leaves out a defined variable that nothing asked for. */
    private void addLimit(SolvePlan plan, Variable<?> variable) {
        final int slot = plan.plant().slotOf(variable);
        if (plan.isActive(slot)) {
            limits.add(new Limit(variable, slot));
        }
    }

    /** {@return what no real machine could do in a solution, in words} */
    List<String> findings(Solution solution) {
        final List<String> findings = new ArrayList<>();
        for (Balance balance : balances) {
            checkEntropy(balance, solution, findings);
        }
        for (Limit limit : limits) {
            final double value = solution.si(limit.slot);
            final double room = ROUNDING * Math.max(1, Math.abs(value));
            if (value < limit.variable.lowest() - room || value > limit.variable.highest() + room) {
                findings.add(limit.variable + " would have to be " + solution.value(limit.variable));
            }
        }
        final double[] values = solution.requirements();
        for (int i = 0; i < values.length; i++) {
            if (values[i] < 0) {
                final Equations.Requirement requirement = requirements.get(i);
                findings.add(requirement.component() + ": " + requirement.words() + " is not met (by "
                        + (float) -values[i] + ")");
            }
        }
        return findings;
    }

    /** A component with heat of unknown temperature has no balance. */
    private static void checkEntropy(Balance balance, Solution solution, List<String> findings) {
        double generation = 0;
        double largest = 0;
        for (EntropyFlow flow : balance.flows) {
            final double by = flow.entropy == NONE ? 1 / solution.si(flow.temperature) : solution.si(flow.entropy);
            if (flow.entropy == NONE && Double.isNaN(by)) {
                return;
            }
            final double entropy = flow.sign * solution.si(flow.first) * by;
            generation += entropy;
            largest = Math.max(largest, Math.abs(entropy));
        }
        if (generation < -ROUNDING * largest) {
            findings.add(balance.component + " would destroy entropy (" + EntropyRate.wattsPerKelvin(generation) + ")");
        }
    }
}
