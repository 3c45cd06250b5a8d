package lostwork.plant;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.PriorityQueue;
import java.util.function.IntPredicate;
import lostwork.fluid.FluidModel;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.StartValues;
import lostwork.plant.kernel.Workspace;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * Start values for loops from what is known nearby: pressures along lines without a machine between, or from saturation
 * at a known temperature; enthalpies from a known temperature, vapour fraction or neighbour; flows from the same network.
 */
final class NeighbourStarts implements StartValues {
    /** The length of a step across a component, against 1 along a pressure link. */
    private static final int ACROSS = 20;

    private static final double FALLBACK_TEMPERATURE_K = 350;

    private record Link(int to, int length) {}

    private final Layout layout;
    private final List<List<Link>> links = new ArrayList<>();
    private final boolean[] given;

    NeighbourStarts(Plant plant, List<Planner.Entry> entries, boolean[] given) {
        layout = plant.layout();
        this.given = given;
        for (int i = 0; i < layout.states.size(); i++) {
            links.add(new ArrayList<>());
        }
        for (Component component : plant.components()) {
            final List<Integer> touched = component.ports().stream()
                    .filter(MaterialPort.class::isInstance)
                    .map(port -> layout.stateOf.get((MaterialPort) port))
                    .distinct()
                    .toList();
            for (int a : touched) {
                for (int b : touched) {
                    if (a != b) {
                        links.get(a).add(new Link(b, ACROSS));
                    }
                }
            }
        }
        for (Planner.Entry entry : entries) {
            linkPressures(entry);
        }
    }

    /** An equation between two pressures and nothing else but a loss joins their states closely. */
    private void linkPressures(Planner.Entry entry) {
        final List<Integer> states = new ArrayList<>();
        for (int k = 0; k < entry.tape().size(); k++) {
            final Layout.Slot slot = layout.slots.get(entry.tape().slot(k));
            if (slot.role() == SlotRole.PRESSURE) {
                states.add(slot.state());
            } else if (!slot.kind().dimension().equals(Pressure.KIND.dimension())) {
                return;
            }
        }
        if (states.size() == 2) {
            links.get(states.get(0)).add(new Link(states.get(1), 1));
            links.get(states.get(1)).add(new Link(states.get(0), 1));
        }
    }

    @Override
    public void prepare(int[] slots, boolean[] known, Workspace w) {
        final boolean[] settled = known.clone();
        for (SlotRole role : List.of(SlotRole.PRESSURE, SlotRole.FLOW, SlotRole.ENTHALPY)) {
            for (int slot : slots) {
                if (layout.slots.get(slot).role() == role) {
                    w.set(slot, core(slot, role, settled, w));
                }
            }
            for (int slot : slots) {
                if (layout.slots.get(slot).role() == role) {
                    settled[slot] = true;
                }
            }
        }
        for (int slot : slots) {
            if (!settled[slot]) {
                w.set(slot, other(slot, settled, w));
            }
        }
    }

    private double core(int slot, SlotRole role, boolean[] settled, Workspace w) {
        final double value = switch (role) {
            case PRESSURE -> pressure(layout.slots.get(slot).state(), settled, w);
            case FLOW -> flow(slot, settled, w);
            default -> enthalpy(layout.slots.get(slot).state(), settled, w);
        };
        return layout.scales.get(slot).clamp(value);
    }

    private double valueOrStart(int slot, SlotRole role, boolean[] settled, Workspace w) {
        return settled[slot] ? w.get(slot) : core(slot, role, settled, w);
    }

    private double pressure(int index, boolean[] settled, Workspace w) {
        final Layout.StreamState state = layout.states.get(index);
        final SaturationModel saturation = state.model().saturation();
        final int t = state.slot(SlotRole.TEMPERATURE);
        final boolean wet = given[state.slot(SlotRole.VAPOUR_FRACTION)]
                || given[state.slot(SlotRole.SUBCOOLING)]
                || given[state.slot(SlotRole.SUPERHEAT)];
        if (saturation != null && settled[t] && wet && inSaturation(saturation, w.get(t))) {
            return saturation.pressure(w.get(t));
        }
        final int near = nearest(index, SlotRole.PRESSURE, settled, true);
        if (near >= 0) {
            return w.get(layout.states.get(near).slot(SlotRole.PRESSURE));
        }
        if (saturation != null) {
            final int warm = settled[t] ? index : nearest(index, SlotRole.TEMPERATURE, settled, false);
            if (warm >= 0) {
                final double temperature = w.get(layout.states.get(warm).slot(SlotRole.TEMPERATURE));
                if (inSaturation(saturation, temperature)) {
                    return saturation.pressure(temperature);
                }
            }
            return 0.1 * saturation.criticalPressure();
        }
        return 1e5;
    }

    private static boolean inSaturation(SaturationModel saturation, double temperature) {
        return temperature > saturation.lowestTemperature() && temperature < 0.98 * saturation.criticalTemperature();
    }

    private double flow(int slot, boolean[] settled, Workspace w) {
        final int from = layout.slots.get(slot).state();
        final Map<Integer, Integer> flowOfState = new HashMap<>();
        layout.flowSlotOf.forEach((port, s) -> {
            if (settled[s]) {
                flowOfState.putIfAbsent(layout.stateOf.get(port), s);
            }
        });
        final int near = nearestWhere(from, true, index -> flowOfState.containsKey(index));
        return near >= 0
                ? w.get(flowOfState.get(near))
                : layout.scales.get(slot).natural();
    }

    private double enthalpy(int index, boolean[] settled, Workspace w) {
        final Layout.StreamState state = layout.states.get(index);
        final FluidModel model = state.model();
        // The pressure may belong to a later block, when the equations here do not depend on it.
        final double p = valueOrStart(state.slot(SlotRole.PRESSURE), SlotRole.PRESSURE, settled, w);
        final StatePoint point = new StatePoint();
        final int t = state.slot(SlotRole.TEMPERATURE);
        if (settled[t]) {
            return enthalpyAt(model, w.get(t), p, point);
        }
        final SaturationModel saturation = model.saturation();
        if (saturation != null && p < saturation.criticalPressure()) {
            final int x = state.slot(SlotRole.VAPOUR_FRACTION);
            final int superheat = state.slot(SlotRole.SUPERHEAT);
            final int subcooling = state.slot(SlotRole.SUBCOOLING);
            if (settled[x]) {
                return fractionAt(model, p, w.get(x), point);
            }
            if (settled[superheat]) {
                return enthalpyAt(model, saturationAt(saturation, p) + w.get(superheat) + 1e-6, p, point);
            }
            if (settled[subcooling]) {
                return enthalpyAt(model, saturationAt(saturation, p) - w.get(subcooling) - 1e-6, p, point);
            }
        }
        final int near = nearest(index, SlotRole.ENTHALPY, settled, true);
        if (near >= 0) {
            return w.get(layout.states.get(near).slot(SlotRole.ENTHALPY));
        }
        final int warm = nearest(index, SlotRole.TEMPERATURE, settled, false);
        final double temperature =
                warm >= 0 ? w.get(layout.states.get(warm).slot(SlotRole.TEMPERATURE)) : FALLBACK_TEMPERATURE_K;
        return enthalpyAt(model, temperature, p, point);
    }

    private static double saturationAt(SaturationModel saturation, double p) {
        final double lowest = saturation.pressure(saturation.lowestTemperature());
        return saturation.temperature(Math.max(p, lowest));
    }

    private static double enthalpyAt(FluidModel model, double temperature, double pressure, StatePoint point) {
        final double low = model.lowestTemperatureAt(pressure);
        final double high = model.highestTemperatureAt(pressure);
        try {
            model.atTemperaturePressure(Math.max(low, Math.min(high, temperature)), pressure, point);
            return point.enthalpy;
        } catch (OutOfRangeException e) {
            model.atTemperaturePressure(0.5 * (low + high), pressure, point);
            return point.enthalpy;
        }
    }

    private static double fractionAt(FluidModel model, double pressure, double x, StatePoint point) {
        try {
            model.atPressureVapourFraction(pressure, Math.max(0, Math.min(1, x)), point);
            return point.enthalpy;
        } catch (OutOfRangeException e) {
            return enthalpyAt(model, FALLBACK_TEMPERATURE_K, pressure, point);
        }
    }

    private double other(int slot, boolean[] settled, Workspace w) {
        final Layout.Slot it = layout.slots.get(slot);
        if (it.state() >= 0) {
            return stateProperty(it, settled, w);
        }
        if (it.kind() == Temperature.KIND) {
            return FALLBACK_TEMPERATURE_K;
        }
        if (it.kind() == Ratio.KIND) {
            return 0.7;
        }
        if (it.kind() == TemperatureSpan.KIND) {
            return 10;
        }
        return it.kind() == Power.KIND ? 0 : layout.scales.get(slot).natural();
    }

    private double stateProperty(Layout.Slot slot, boolean[] settled, Workspace w) {
        final Layout.StreamState state = layout.states.get(slot.state());
        final StatePoint point = new StatePoint();
        final double p = valueOrStart(state.slot(SlotRole.PRESSURE), SlotRole.PRESSURE, settled, w);
        final double h = valueOrStart(state.slot(SlotRole.ENTHALPY), SlotRole.ENTHALPY, settled, w);
        try {
            state.model().atPressureEnthalpy(p, h, point);
        } catch (OutOfRangeException e) {
            return slot.role() == SlotRole.TEMPERATURE ? FALLBACK_TEMPERATURE_K : 0;
        }
        return switch (slot.role()) {
            case TEMPERATURE -> point.temperature;
            case ENTROPY -> point.entropy;
            case VOLUME -> point.volume;
            default -> 0;
        };
    }

    private int nearest(int from, SlotRole role, boolean[] settled, boolean sameFluid) {
        return nearestWhere(
                from, sameFluid, index -> settled[layout.states.get(index).slot(role)]);
    }

    /** The nearest state, the own one first, that fulfils a condition; −1 for none (Dijkstra). */
    private int nearestWhere(int from, boolean sameFluid, IntPredicate wanted) {
        final FluidModel model = layout.states.get(from).model();
        final int[] distance = new int[layout.states.size()];
        Arrays.fill(distance, Integer.MAX_VALUE);
        distance[from] = 0;
        final PriorityQueue<int[]> queue =
                new PriorityQueue<>((a, b) -> a[0] != b[0] ? Integer.compare(a[0], b[0]) : Integer.compare(a[1], b[1]));
        queue.add(new int[] {0, from});
        while (!queue.isEmpty()) {
            final int[] head = queue.poll();
            final int index = head[1];
            if (head[0] > distance[index]) {
                continue;
            }
            if ((!sameFluid || layout.states.get(index).model() == model) && wanted.test(index)) {
                return index;
            }
            for (Link link : links.get(index)) {
                final int length = head[0] + link.length();
                if (length < distance[link.to()]) {
                    distance[link.to()] = length;
                    queue.add(new int[] {length, link.to()});
                }
            }
        }
        return -1;
    }
}
