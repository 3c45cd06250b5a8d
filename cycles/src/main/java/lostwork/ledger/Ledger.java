package lostwork.ledger;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Set;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.plant.Component;
import lostwork.plant.Outlet;
import lostwork.plant.Plant;
import lostwork.plant.Port;
import lostwork.plant.Solution;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * The exergy ledger of a solved plant: the exergy of every stream, what every component destroys by two books, and the
 * totals of the plant.
 *
 * <pre>{@code
 * Ledger ledger = Ledger.of(solution, site);
 * ledger.of(turbine).destruction();     // a Power
 * ledger.ranking();                     // where the work is lost, worst first
 * System.out.println(ledger);
 * }</pre>
 *
 * <p>Immutable and thread-safe.
 */
public final class Ledger {
    private final Solution solution;
    private final ReferenceEnvironment environment;
    private final List<StreamExergy> streams;
    private final List<ComponentExergy> components;
    private final List<BoundaryExergy> boundary;
    private final List<String> notes;

    private Ledger(
            Solution solution,
            ReferenceEnvironment environment,
            List<StreamExergy> streams,
            List<ComponentExergy> components,
            List<BoundaryExergy> boundary,
            List<String> notes) {
        this.solution = solution;
        this.environment = environment;
        this.streams = List.copyOf(streams);
        this.components = List.copyOf(components);
        this.boundary = List.copyOf(boundary);
        this.notes = List.copyOf(notes);
    }

    /**
     * {@return the ledger, with the flows across the boundary judged by their direction}
     *
     * @param solution the solved plant
     * @param environment the reference environment of the books
     */
    public static Ledger of(Solution solution, ReferenceEnvironment environment) {
        return of(solution, environment, BoundaryMarks.byDirection());
    }

    /**
     * {@return the ledger}
     *
     * @param solution the solved plant
     * @param environment the reference environment of the books
     * @param marks what the flows across the boundary are
     * @throws NoSuchElementException if a marked port is not at the boundary of the plant
     */
    public static Ledger of(Solution solution, ReferenceEnvironment environment, BoundaryMarks marks) {
        final PortExergies exergies = new PortExergies(solution, environment);
        final Plant plant = solution.plant();
        final List<StreamExergy> streams = new ArrayList<>();
        final Set<Port> connected = new HashSet<>();
        for (Plant.Connection connection : plant.connections()) {
            connected.add(connection.from());
            connected.add(connection.to());
            if (connection.from() instanceof Outlet outlet) {
                streams.add(exergies.stream(outlet, connection.to()));
            }
        }
        final List<ComponentExergy> components = new ArrayList<>();
        final List<BoundaryExergy> boundary = new ArrayList<>();
        final Set<Port> unused = new HashSet<>();
        marks.ports().forEach(unused::add);
        for (Component component : plant.components()) {
            if (!component.isBoundary()) {
                components.add(exergies.account(component));
            }
            for (Port port : component.ports()) {
                final boolean crosses = component.isBoundary() || !connected.contains(port);
                if (crosses) {
                    // What leaves a supply enters the plant.
                    final boolean enters = component.isBoundary() != port.isInlet();
                    boundary.add(new BoundaryExergy(
                            port.toString(), enters, exergies.rate(port), marks.roleOf(port, enters)));
                    unused.remove(port);
                }
            }
        }
        if (!unused.isEmpty()) {
            throw new NoSuchElementException("marked, but not at the boundary of plant \"" + plant.name() + "\": "
                    + unused + "; the ports at its boundary are "
                    + boundary.stream().map(BoundaryExergy::port).toList());
        }
        final List<String> notes = exergies.shifted().stream()
                .map(zero -> "The model of " + zero.fluid()
                        + " does not reach the ambient temperature: its exergy counts from " + zero.temperature()
                        + ". Destructions and differences do not depend on that.")
                .toList();
        return new Ledger(solution, environment, streams, components, boundary, notes);
    }

    /** {@return the solved plant} */
    public Solution solution() {
        return solution;
    }

    /** {@return the reference environment of the books} */
    public ReferenceEnvironment environment() {
        return environment;
    }

    /** {@return the exergy of every stream} */
    public List<StreamExergy> streams() {
        return streams;
    }

    /** {@return the account of every component, supplies and discharges left out, ordered by name} */
    public List<ComponentExergy> components() {
        return components;
    }

    /** {@return the exergy flows across the boundary of the plant} */
    public List<BoundaryExergy> boundary() {
        return boundary;
    }

    /** {@return what the reader of the ledger must know, in sentences; empty when there is nothing} */
    public List<String> notes() {
        return notes;
    }

    /**
     * {@return the account of a component}
     *
     * @param component the component
     * @throws NoSuchElementException if the ledger has no account of it
     */
    public ComponentExergy of(Component component) {
        return components.stream()
                .filter(c -> c.component().equals(component.name()))
                .findFirst()
                .orElseThrow(() -> new NoSuchElementException("no account of \"" + component
                        + "\"; the accounts are of "
                        + components.stream().map(ComponentExergy::component).toList()));
    }

    /** {@return the accounts, the largest destruction first} */
    public List<ComponentExergy> ranking() {
        return components.stream()
                .sorted(Comparator.comparing(ComponentExergy::destruction).reversed())
                .toList();
    }

    /** {@return the exergy that the plant uses up} */
    public Power fuel() {
        return total(BoundaryRole.FUEL, true);
    }

    /** {@return the exergy that the plant is there to make} */
    public Power product() {
        return total(BoundaryRole.PRODUCT, false);
    }

    /** {@return the exergy that leaves without use} */
    public Power loss() {
        return total(BoundaryRole.LOSS, false);
    }

    /** {@return the exergy that all components destroy} */
    public Power destruction() {
        Power sum = Power.watts(0);
        for (ComponentExergy component : components) {
            sum = sum.plus(component.destruction());
        }
        return sum;
    }

    private Power total(BoundaryRole role, boolean positiveEntering) {
        Power sum = Power.watts(0);
        for (BoundaryExergy flow : boundary) {
            if (flow.role() == role) {
                sum = flow.enters() == positiveEntering ? sum.plus(flow.rate()) : sum.minus(flow.rate());
            }
        }
        return sum;
    }

    /**
     * {@return product over fuel}
     *
     * @throws IllegalArgumentException if the plant uses no fuel
     */
    public Ratio efficiency() {
        return product().over(fuel());
    }

    /** {@return what is left of fuel less product, loss and destruction: zero up to rounding} */
    public Power gap() {
        return fuel().minus(product()).minus(loss()).minus(destruction());
    }

    /** {@return the largest of the gap of the plant and the differences of the two books, against the fuel exergy} */
    public Ratio closure() {
        double largest = Math.abs(gap().si());
        for (ComponentExergy component : components) {
            largest = Math.max(largest, Math.abs(component.difference().si()));
        }
        return Ratio.fraction(largest / Math.abs(fuel().si()));
    }

    /**
     * Writes the components and the streams as CSV, one table after the other with an empty line between.
     *
     * @param file the file to write, in UTF-8; replaced when it exists
     * @throws IOException if the file cannot be written
     */
    public void writeCsv(Path file) throws IOException {
        final LedgerTables tables = new LedgerTables(this);
        Files.writeString(
                file, tables.components().toCsv() + "\n" + tables.streams().toCsv(), StandardCharsets.UTF_8);
    }

    /**
     * Writes the ledger as JSON.
     *
     * @param file the file to write, in UTF-8; replaced when it exists
     * @throws IOException if the file cannot be written
     */
    public void writeJson(Path file) throws IOException {
        Files.writeString(file, new LedgerTables(this).toJson(), StandardCharsets.UTF_8);
    }

    /** {@return the ledger as aligned tables: components, streams, boundary, totals and closure} */
    @Override
    public String toString() {
        return new LedgerTables(this).toText();
    }
}
