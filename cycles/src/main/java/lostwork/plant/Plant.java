package lostwork.plant;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Objects;
import java.util.Set;
import java.util.TreeMap;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.plant.kernel.Tape;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.ScalarQuantity;

/**
 * Components and their connections: a set of equations in named variables. What is given of it is said by a
 * {@link Specification}.
 *
 * <p>Immutable and thread-safe. The order in which components and connections were added has no influence on any result.
 */
public final class Plant {
    private final String name;
    private final List<Component> components;
    private final List<Connection> connections;
    private final Layout layout;
    private final List<Equation> equations;
    private final Map<Variable<?>, Equation> definitions;
    private final List<Equations.MassBalance> balances;
    private final List<Equations.Requirement> requirements;
    private final Resolution resolution;

    /**
     * A connection of two ports.
     *
     * @param from the port that delivers
     * @param to the port that takes
     */
    public record Connection(Port from, Port to) {}

    private Plant(Builder builder) {
        name = builder.name;
        components = builder.components.values().stream().toList();
        connections = builder.connections.stream()
                .sorted(Comparator.comparing(c -> c.from() + " → " + c.to()))
                .toList();
        final List<Port> ports = components.stream()
                .flatMap(c -> c.ports().stream().sorted(Comparator.comparing(Port::name)))
                .toList();
        final PortUnions unions = new PortUnions(ports);
        connections.forEach(c -> unions.connect(c.from(), c.to()));
        final List<Equation> stated = new ArrayList<>();
        // Sorted, so that the order of adding plays no part.
        final Map<Variable<?>, Equation> defined = new TreeMap<>(
                Comparator.<Variable<?>, String>comparing(Variable::component).thenComparing(Variable::name));
        final List<Equations.MassBalance> masses = new ArrayList<>();
        final List<Equations.Requirement> required = new ArrayList<>();
        for (Component component : components) {
            final Equations e = new Equations(component.name(), unions);
            component.describe(e);
            stated.addAll(e.equations);
            defined.putAll(e.definitions);
            masses.addAll(e.balances);
            required.addAll(e.requirements);
        }
        builder.definitions.forEach((variable, equation) -> defined.put(variable, equation));
        builder.media.forEach(unions::fluid);
        equations = List.copyOf(stated);
        definitions = Collections.unmodifiableMap(defined);
        balances = List.copyOf(masses);
        requirements = List.copyOf(required);
        layout = Layout.of(components, ports, unions, builder.resolveFluids(ports, unions));
        layout.addPlantVariables(defined.keySet().stream()
                .filter(builder.definitions::containsKey)
                .toList());
        resolution = new Resolution() {
            @Override
            public FluidModel modelAt(MaterialPort port) {
                return layout.states.get(layout.stateOf.get(port)).model();
            }

            @Override
            public int emit(Variable<?> variable, Tape.Builder tape) {
                return tape.slot(slotOf(variable));
            }
        };
    }

    /**
     * {@return a builder of a plant}
     *
     * @param name the name of the plant
     */
    public static Builder builder(String name) {
        return new Builder(name);
    }

    /** {@return the name} */
    public String name() {
        return name;
    }

    /** {@return the components, ordered by name} */
    public List<Component> components() {
        return components;
    }

    /** {@return the connections, ordered by the names of their ports} */
    public List<Connection> connections() {
        return connections;
    }

    /** {@return the equations that always hold, assumptions included} */
    public List<Equation> equations() {
        return equations;
    }

    /**
     * {@return a component of this plant}
     *
     * @param <C> the type of the component
     * @param componentName its name
     * @param type its type
     * @throws NoSuchElementException if there is no component of that name and type; the message lists the names
     */
    public <C extends Component> C component(String componentName, Class<C> type) {
        for (Component component : components) {
            if (component.name().equals(componentName) && type.isInstance(component)) {
                return type.cast(component);
            }
        }
        throw new NoSuchElementException("plant \"" + name + "\" has no " + type.getSimpleName() + " \"" + componentName
                + "\"; its components are " + Diagnosis.join(nearFirst(componentName, components)));
    }

    /**
     * {@return a variable of this plant, for plants that were read from a file}
     *
     * @param <Q> the quantity of its values
     * @param componentName the name of its component
     * @param variableName its own name
     * @param kind the kind of its values
     * @throws NoSuchElementException if there is no such variable; the message lists those of the component
     */
    public <Q extends ScalarQuantity<Q, ?>> Variable<Q> variable(
            String componentName, String variableName, QuantityKind<Q, ?> kind) {
        return own(new Variable<>(componentName, variableName, kind));
    }

    /** {@return a specification of this plant in which nothing is given} */
    public Specification specify() {
        return new Specification(this, new LinkedHashMap<>(), null);
    }

    Layout layout() {
        return layout;
    }

    Resolution resolution() {
        return resolution;
    }

    Map<Variable<?>, Equation> definitions() {
        return definitions;
    }

    List<Equations.MassBalance> balances() {
        return balances;
    }

    List<Equations.Requirement> requirements() {
        return requirements;
    }

    /** The plant's own variable of the same name, with the limits that its component sets. */
    @SuppressWarnings("unchecked") // the kinds are the same
    <Q extends ScalarQuantity<Q, ?>> Variable<Q> own(Variable<Q> variable) {
        slotOf(variable);
        return (Variable<Q>) layout.own.get(variable);
    }

    int slotOf(Variable<?> variable) {
        Objects.requireNonNull(variable, "variable");
        final Integer slot = layout.slotOf.get(variable);
        if (slot != null && layout.slots.get(slot).kind() != variable.kind()) {
            throw new NoSuchElementException("\"" + variable + "\" of plant \"" + name + "\" is a "
                    + layout.slots.get(slot).kind().name() + ", not a "
                    + variable.kind().name());
        }
        if (slot == null) {
            final List<String> names = layout.slotOf.keySet().stream()
                    .filter(v -> v.component().equals(variable.component()))
                    .map(Variable::name)
                    .sorted()
                    .toList();
            throw new NoSuchElementException("plant \"" + name + "\" has no variable \"" + variable + "\""
                    + (names.isEmpty()
                            ? "; its components are " + Diagnosis.join(nearFirst(variable.component(), components))
                            : "; the variables of " + variable.component() + " are "
                                    + Diagnosis.join(nearFirst(variable.name(), names))));
        }
        return slot;
    }

    /** Names in the order of how near they come to a misspelt one: by the pairs of neighbouring letters in common. */
    private static List<?> nearFirst(String wanted, List<?> things) {
        final Set<String> pairs = pairs(wanted);
        return things.stream()
                .sorted(Comparator.comparingDouble(thing -> {
                    final Set<String> common = pairs(thing.toString());
                    final int size = common.size() + pairs.size();
                    common.retainAll(pairs);
                    return size == 0 ? 0 : -2.0 * common.size() / size;
                }))
                .toList();
    }

    private static Set<String> pairs(String word) {
        final Set<String> found = new LinkedHashSet<>();
        for (int i = 1; i < word.length(); i++) {
            found.add(word.substring(i - 1, i + 1));
        }
        return found;
    }

    /** {@return the plant as text: its components, connections and fluids} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder("Plant \"" + name + "\"\n");
        for (Component component : components) {
            text.append("  ")
                    .append(component.getClass().getSimpleName())
                    .append(" \"")
                    .append(component.name())
                    .append("\"\n");
        }
        for (Connection connection : connections) {
            text.append("  ").append(connection.from()).append(" → ").append(connection.to());
            if (connection.from() instanceof MaterialPort port) {
                text.append("   ").append(resolution.modelAt(port).name());
            }
            text.append('\n');
        }
        return text.toString();
    }

    /** Builds a plant: components first, then connections, in any order. Not thread-safe. */
    public static final class Builder {
        private final String name;
        private final TreeMap<String, Component> components = new TreeMap<>();
        private final List<Connection> connections = new ArrayList<>();
        private final Map<MaterialPort, Fluid> media = new LinkedHashMap<>();
        private final Map<Variable<?>, Equation> definitions = new LinkedHashMap<>();

        private Builder(String name) {
            if (name.isBlank()) {
                throw new IllegalArgumentException("a plant needs a name that is not blank");
            }
            this.name = name;
        }

        /**
         * Adds a component.
         *
         * @param <C> the type of the component
         * @param component the component
         * @return the component itself
         * @throws IllegalArgumentException if another component has the same name
         */
        public <C extends Component> C add(C component) {
            if (component.name().equals(name) || components.putIfAbsent(component.name(), component) != null) {
                throw new IllegalArgumentException("plant \"" + name + "\" already has something named \""
                        + component.name() + "\"; names must differ");
            }
            return component;
        }

        /**
         * Connects two components by a stream.
         *
         * @param from where the stream leaves
         * @param to where it enters
         * @return this builder
         */
        public Builder connect(Outlet from, Inlet to) {
            return join(from, to);
        }

        /**
         * Connects two components by a shaft.
         *
         * @param from where the power leaves
         * @param to where it enters
         * @return this builder
         */
        public Builder connect(ShaftOutlet from, ShaftInlet to) {
            return join(from, to);
        }

        /**
         * Connects two components by a wire.
         *
         * @param from where the power leaves
         * @param to where it enters
         * @return this builder
         */
        public Builder connect(WireOutlet from, WireInlet to) {
            return join(from, to);
        }

        /**
         * Connects two components by a flow of heat.
         *
         * @param from where the heat leaves
         * @param to where it enters
         * @return this builder
         */
        public Builder connect(HeatOutlet from, HeatInlet to) {
            return join(from, to);
        }

        /**
         * Connects components one after the other.
         *
         * @param paths the ways through the components, in the direction of the stream
         * @return this builder
         */
        public Builder line(FlowPath... paths) {
            for (int i = 1; i < paths.length; i++) {
                connect(paths[i - 1].outlet(), paths[i].inlet());
            }
            return this;
        }

        /**
         * Connects components to a closed circuit of one fluid.
         *
         * @param fluid the fluid that goes round
         * @param paths the ways through the components, in the direction of the stream; the last one leads to the first
         * @return this builder
         */
        public Builder circuit(Fluid fluid, FlowPath... paths) {
            if (paths.length == 0) {
                throw new IllegalArgumentException("a circuit needs at least one way through a component");
            }
            line(paths);
            connect(paths[paths.length - 1].outlet(), paths[0].inlet());
            return medium(paths[0].inlet(), fluid);
        }

        /**
         * Says which fluid passes a port; it holds for all ports that the same fluid reaches.
         *
         * @param port the port
         * @param fluid the fluid
         * @return this builder
         */
        public Builder medium(MaterialPort port, Fluid fluid) {
            media.put(port, fluid);
            return this;
        }

        /**
         * Defines a variable of the plant as a whole, such as its net power.
         *
         * @param <Q> the quantity of its values
         * @param variableName its name
         * @param kind the kind of its values
         * @param value what it equals
         * @return the variable, which can be given or read like every other one
         */
        public <Q extends ScalarQuantity<Q, ?>> Variable<Q> define(
                String variableName, QuantityKind<Q, ?> kind, Expression value) {
            final Variable<Q> variable = new Variable<>(name, variableName, kind);
            final Equation equation =
                    new Equation(name, "definition of " + variableName, EquationTag.LAW, variable, value);
            if (definitions.putIfAbsent(variable, equation) != null) {
                throw new IllegalArgumentException("plant \"" + name + "\" already defines " + variableName);
            }
            return variable;
        }

        /**
         * {@return the plant}
         *
         * @throws PlantException if a port of a stream is not connected, is connected twice, or its fluid is not known
         */
        public Plant build() {
            final List<String> findings = new ArrayList<>();
            checkConnections(findings);
            if (!findings.isEmpty()) {
                throw new PlantException(name, findings);
            }
            return new Plant(this);
        }

        private Builder join(Port from, Port to) {
            connections.add(new Connection(from, to));
            return this;
        }

        private void checkConnections(List<String> findings) {
            final Map<Port, Port> partner = new HashMap<>();
            final Set<Port> own = new LinkedHashSet<>();
            components.values().forEach(c -> own.addAll(c.ports()));
            for (Connection connection : connections) {
                for (Port port : List.of(connection.from(), connection.to())) {
                    if (!own.contains(port)) {
                        findings.add(port + " is connected, but its component was not added; call add(...) for it");
                    }
                }
                pair(connection.from(), connection.to(), partner, findings);
                pair(connection.to(), connection.from(), partner, findings);
            }
            for (Port port : own) {
                if (port instanceof MaterialPort && !partner.containsKey(port)) {
                    findings.add(port + " is not connected; connect it, or end the stream with a "
                            + (port instanceof Inlet ? "Supply" : "Discharge"));
                }
            }
        }

        private static void pair(Port port, Port other, Map<Port, Port> partner, List<String> findings) {
            final Port before = partner.putIfAbsent(port, other);
            if (before != null) {
                findings.add(port + " is connected twice, to " + before + " and to " + other
                        + "; put a Splitter or a Mixer between them");
            }
        }

        private Map<Integer, Fluid> resolveFluids(List<Port> ports, PortUnions unions) {
            final Map<Integer, Fluid> fluids = new LinkedHashMap<>();
            final Map<Integer, MaterialPort> statedAt = new LinkedHashMap<>();
            final List<String> findings = new ArrayList<>();
            unions.statedFluids().forEach((port, fluid) -> {
                final int root = unions.fluidRoot(port);
                final Fluid before = fluids.putIfAbsent(root, fluid);
                final MaterialPort first = statedAt.putIfAbsent(root, port);
                if (before != null && !before.equals(fluid)) {
                    findings.add(
                            "two fluids meet in one stream: " + before.model().name() + " at " + first + " and "
                                    + fluid.model().name() + " at " + port);
                }
            });
            final Set<Integer> unknown = new HashSet<>();
            for (Port port : ports) {
                if (port instanceof MaterialPort
                        && !fluids.containsKey(unions.fluidRoot(port))
                        && unknown.add(unions.fluidRoot(port))) {
                    findings.add("the fluid at " + port + " is not known; start the stream with a Supply, or use "
                            + "circuit(fluid, ...) or medium(port, fluid)");
                }
            }
            if (!findings.isEmpty()) {
                throw new PlantException(name, findings);
            }
            return fluids;
        }
    }
}
