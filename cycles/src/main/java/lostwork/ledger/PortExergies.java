package lostwork.ledger;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
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
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;

/** The exergy and the entropy that pass the ports of a solved plant. */
final class PortExergies {
    private final Solution solution;
    private final ReferenceEnvironment environment;
    private final Map<Fluid, ZeroState> zeros = new LinkedHashMap<>();

    PortExergies(Solution solution, ReferenceEnvironment environment) {
        this.solution = solution;
        this.environment = environment;
    }

    /** The state that the exergy of the fluid at a port counts from, found once for each fluid. */
    private ZeroState zeroOf(MaterialPort port) {
        return zeros.computeIfAbsent(solution.state(port).fluid(), fluid -> ZeroState.of(fluid, environment));
    }

    /** {@return the fluids whose model does not reach the dead state, with the state that they count from} */
    List<ZeroState> shifted() {
        return zeros.values().stream().filter(ZeroState::isShifted).toList();
    }

    StreamExergy stream(Outlet outlet, Port to) {
        final ZeroState zero = zeroOf(outlet);
        final FluidState state = solution.state(outlet);
        final double total =
                zero.flowExergy(state.enthalpy().si(), state.entropy().si());
        final FluidState cooled = state.broughtTo(zero.temperature(), state.pressure());
        final double mechanical =
                zero.flowExergy(cooled.enthalpy().si(), cooled.entropy().si());
        return new StreamExergy(
                outlet.toString(),
                to.toString(),
                solution.value(outlet.flow()),
                SpecificEnergy.joulesPerKilogram(total - mechanical),
                SpecificEnergy.joulesPerKilogram(mechanical));
    }

    /** The exergy rate at a port, positive in the direction of the port. */
    Power rate(Port port) {
        if (port instanceof MaterialPort material) {
            return Power.watts(solution.value(material.flow()).si()
                    * zeroOf(material)
                            .flowExergy(
                                    solution.value(material.enthalpy()).si(),
                                    solution.value(material.entropy()).si()));
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
