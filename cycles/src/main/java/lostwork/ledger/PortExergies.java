package lostwork.ledger;

import lostwork.exergy.FlowExergy;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.plant.Component;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatPort;
import lostwork.plant.MaterialPort;
import lostwork.plant.Outlet;
import lostwork.plant.Port;
import lostwork.plant.ShaftPort;
import lostwork.plant.Solution;
import lostwork.plant.WirePort;
import lostwork.quantity.Power;
import lostwork.quantity.Temperature;

/** The exergy and the entropy that pass the ports of a solved plant. */
final class PortExergies {
    private final Solution solution;
    private final ReferenceEnvironment environment;

    PortExergies(Solution solution, ReferenceEnvironment environment) {
        this.solution = solution;
        this.environment = environment;
    }

    StreamExergy stream(Outlet outlet, Port to) {
        final FlowExergy parts = environment.flowExergyParts(solution.state(outlet));
        return new StreamExergy(
                outlet.toString(), to.toString(), solution.value(outlet.flow()), parts.thermal(), parts.mechanical());
    }

    /** The exergy rate at a port, positive in the direction of the port. */
    Power rate(Port port) {
        if (port instanceof MaterialPort material) {
            return solution.value(material.flow()).times(environment.flowExergy(solution.state(material)));
        }
        if (port instanceof HeatPort heat) {
            return environment.heatExergy(solution.value(heat.rate()), temperature(heat));
        }
        return power(port);
    }

    private Power power(Port port) {
        return port instanceof ShaftPort shaft
                ? solution.value(shaft.power())
                : solution.value(((WirePort) port).power());
    }

    /** Heat whose temperature nothing settles passes at the ambient temperature. */
    private Temperature temperature(HeatPort heat) {
        return solution.hasValue(heat.temperature()) ? solution.value(heat.temperature()) : environment.temperature();
    }

    ComponentExergy account(Component component) {
        double byBalance = 0;
        double entropy = 0;
        for (Port port : component.ports()) {
            final double sign = port.isInlet() ? 1 : -1;
            byBalance += sign * rate(port).si();
            if (port instanceof MaterialPort material) {
                entropy -= sign
                        * solution.value(material.flow()).si()
                        * solution.value(material.entropy()).si();
            } else if (port instanceof HeatPort heat) {
                entropy -= sign
                        * solution.value(heat.rate()).si()
                        / temperature(heat).si();
            }
        }
        final ExergyPurpose purpose = component.purpose();
        return new ComponentExergy(
                component.name(),
                purpose.isDissipative(),
                sum(purpose.fuel()),
                sum(purpose.product()),
                Power.watts(byBalance),
                Power.watts(environment.temperature().si() * entropy));
    }

    private Power sum(Iterable<ExergyPurpose.Term> terms) {
        Power sum = Power.watts(0);
        for (ExergyPurpose.Term term : terms) {
            sum = sum.plus(rate(term.port()));
            if (term.less() != null) {
                sum = sum.minus(rate(term.less()));
            }
        }
        return sum;
    }
}
