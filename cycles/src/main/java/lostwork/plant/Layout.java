package lostwork.plant;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.plant.kernel.SlotScale;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * The slots of a plant: one for each physical value, shared by all variables that name it. Slots are numbered in an order
 * that depends on names only, so that a plant built in another order computes bit by bit the same.
 */
final class Layout {
    static final int PROPERTIES = SlotRole.OF_STATE.length;

    /** One slot: the variables that name it, and what it is. */
    record Slot(Variable<?> variable, SlotRole role, int state) {
        QuantityKind<?, ?> kind() {
            return variable.kind();
        }
    }

    /** One state of a stream, with all the ports that it is found at. */
    record StreamState(int index, List<MaterialPort> ports, Fluid fluid) {
        FluidModel model() {
            return fluid.model();
        }

        int slot(SlotRole role) {
            return index * PROPERTIES + role.ordinal();
        }

        /** The port that the state is called by: an outlet where there is one. */
        MaterialPort port() {
            for (MaterialPort port : ports) {
                if (port instanceof Outlet) {
                    return port;
                }
            }
            return ports.get(0);
        }
    }

    final List<StreamState> states = new ArrayList<>();
    final List<Slot> slots = new ArrayList<>();
    final List<SlotScale> scales = new ArrayList<>();
    final Map<Variable<?>, Integer> slotOf = new HashMap<>();
    /** The plant's own variable of each name, which knows its limits. */
    final Map<Variable<?>, Variable<?>> own = new HashMap<>();

    final Map<MaterialPort, Integer> stateOf = new LinkedHashMap<>();
    final Map<MaterialPort, Integer> flowSlotOf = new LinkedHashMap<>();

    static Layout of(List<Component> components, List<Port> ports, PortUnions unions, Map<Integer, Fluid> fluids) {
        final Layout layout = new Layout();
        layout.addStates(ports, unions, fluids);
        layout.addFlows(ports, unions);
        layout.addTransfers(ports, unions);
        for (Component component : components) {
            for (Variable<?> variable : component.variables()) {
                layout.add(new Slot(variable, SlotRole.OTHER, -1), List.of(variable));
            }
        }
        return layout;
    }

    /** Adds the variables that the plant as a whole defines. */
    void addPlantVariables(Iterable<Variable<?>> variables) {
        for (Variable<?> variable : variables) {
            add(new Slot(variable, SlotRole.OTHER, -1), List.of(variable));
        }
    }

    private void addStates(List<Port> ports, PortUnions unions, Map<Integer, Fluid> fluids) {
        final Map<Integer, List<MaterialPort>> groups = new LinkedHashMap<>();
        for (Port port : ports) {
            if (port instanceof MaterialPort material) {
                groups.computeIfAbsent(unions.stateRoot(port), k -> new ArrayList<>())
                        .add(material);
            }
        }
        for (List<MaterialPort> group : groups.values()) {
            final Fluid fluid = fluids.get(unions.fluidRoot(group.get(0)));
            final StreamState state = new StreamState(states.size(), List.copyOf(group), fluid);
            states.add(state);
            for (MaterialPort port : group) {
                stateOf.put(port, state.index());
            }
            for (SlotRole role : SlotRole.OF_STATE) {
                final List<Variable<?>> names = new ArrayList<>();
                group.forEach(port -> names.add(property(port, role)));
                add(new Slot(property(state.port(), role), role, state.index()), names);
            }
        }
    }

    private static Variable<?> property(MaterialPort port, SlotRole role) {
        return switch (role) {
            case PRESSURE -> port.pressure();
            case ENTHALPY -> port.enthalpy();
            case TEMPERATURE -> port.temperature();
            case ENTROPY -> port.entropy();
            case VOLUME -> port.volume();
            case VAPOUR_FRACTION -> port.vapourFraction();
            case SUPERHEAT -> port.superheat();
            case SUBCOOLING -> port.subcooling();
            case FLOW, OTHER -> throw new IllegalArgumentException(role + " is no property of a state");
        };
    }

    private void addFlows(List<Port> ports, PortUnions unions) {
        final Map<Integer, List<MaterialPort>> groups = new LinkedHashMap<>();
        for (Port port : ports) {
            if (port instanceof MaterialPort material) {
                groups.computeIfAbsent(unions.flowRoot(port), k -> new ArrayList<>())
                        .add(material);
            }
        }
        for (List<MaterialPort> group : groups.values()) {
            final List<Variable<?>> names = new ArrayList<>();
            group.forEach(port -> names.add(port.flow()));
            final int slot = add(new Slot(group.get(0).flow(), SlotRole.FLOW, stateOf.get(group.get(0))), names);
            group.forEach(port -> flowSlotOf.put(port, slot));
        }
    }

    private void addTransfers(List<Port> ports, PortUnions unions) {
        final Map<Integer, List<Port>> groups = new LinkedHashMap<>();
        for (Port port : ports) {
            if (!(port instanceof MaterialPort)) {
                groups.computeIfAbsent(unions.transferRoot(port), k -> new ArrayList<>())
                        .add(port);
            }
        }
        for (List<Port> group : groups.values()) {
            final List<Variable<?>> powers = new ArrayList<>();
            final List<Variable<?>> temperatures = new ArrayList<>();
            for (Port port : group) {
                if (port instanceof ShaftPort shaft) {
                    powers.add(shaft.power());
                } else if (port instanceof WirePort wire) {
                    powers.add(wire.power());
                } else if (port instanceof HeatPort heat) {
                    powers.add(heat.rate());
                    temperatures.add(heat.temperature());
                }
            }
            add(new Slot(powers.get(0), SlotRole.OTHER, -1), powers);
            if (!temperatures.isEmpty()) {
                add(new Slot(temperatures.get(0), SlotRole.OTHER, -1), temperatures);
            }
        }
    }

    private int add(Slot slot, List<Variable<?>> names) {
        final int index = slots.size();
        slots.add(slot);
        scales.add(scaleOf(slot));
        for (Variable<?> name : names) {
            if (slotOf.put(name, index) != null) {
                throw new IllegalArgumentException(
                        "two variables are named \"" + name + "\"; one may be that of a port");
            }
            own.put(name, name);
        }
        return index;
    }

    private SlotScale scaleOf(Slot slot) {
        final double natural = slot.kind().naturalScale();
        if (slot.state() >= 0) {
            final FluidModel model = states.get(slot.state()).model();
            final FluidRange range = model.range();
            switch (slot.role()) {
                case PRESSURE -> {
                    return new SlotScale(natural, true, range.lowestPressure(), range.highestPressure());
                }
                case ENTHALPY -> {
                    return EnthalpyLimits.scaleOf(model, natural);
                }
                case TEMPERATURE -> {
                    return new SlotScale(natural, false, range.lowestTemperature(), range.highestTemperature());
                }
                case FLOW -> {
                    return new SlotScale(natural, true, 1e-9, 1e7);
                }
                case VOLUME -> {
                    return new SlotScale(natural, true, 1e-9, 1e9);
                }
                case ENTROPY -> {
                    return new SlotScale(natural, false, -1e6, 1e6);
                }
                case VAPOUR_FRACTION -> {
                    return new SlotScale(natural, false, -1e3, 1e3);
                }
                case SUPERHEAT, SUBCOOLING -> {
                    return new SlotScale(natural, false, -1e4, 1e4);
                }
                case OTHER -> {}
            }
        }
        final boolean signed = slot.kind().lowest() < 0;
        return new SlotScale(
                natural,
                isProportional(slot.kind()),
                signed ? -1e15 * natural : slot.kind().lowest(),
                1e15 * natural);
    }

    /** Sizes that count against the value itself: everything but ratios, temperatures and spans. */
    private static boolean isProportional(QuantityKind<?, ?> kind) {
        return kind != Ratio.KIND
                && kind != Temperature.KIND
                && kind != TemperatureSpan.KIND
                && kind != SpecificEnergy.KIND
                && kind != SpecificEntropy.KIND;
    }
}
