package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What a component is for in terms of exergy: what it uses up (its fuel) and what it is there to make (its product).
 *
 * <p>Fuel and product are sums of the exergies at ports and of differences between two ports, as specific exergy costing
 * defines them (Lazzaretto and Tsatsaronis, Energy 31 (2006) 1257–1289): a turbine spends the drop of the exergy of its
 * stream, and its product is the shaft power. A component whose purpose cannot be said in exergy of its own, such as a
 * condenser or a throttle, is dissipative: it has neither. Immutable; each method gives a new purpose.
 */
public final class ExergyPurpose {
    private static final ExergyPurpose DISSIPATIVE = new ExergyPurpose(List.of(), List.of());

    private final List<Term> fuel;
    private final List<Term> product;

    /**
     * The exergy at a port, or the difference of the exergies at two ports.
     *
     * @param port the port that counts
     * @param less the port whose exergy is taken away; null for none
     */
    public record Term(Port port, @Nullable Port less) {}

    private ExergyPurpose(List<Term> fuel, List<Term> product) {
        this.fuel = fuel;
        this.product = product;
    }

    /** {@return no fuel and no product: the purpose of a component that only destroys exergy} */
    public static ExergyPurpose dissipative() {
        return DISSIPATIVE;
    }

    /**
     * {@return the purpose of a component that uses up the exergy at a port}
     *
     * @param port the port
     */
    public static ExergyPurpose fuel(Port port) {
        return DISSIPATIVE.withFuel(port);
    }

    /**
     * {@return the purpose of a component that uses up the drop of exergy from one port to another}
     *
     * @param from the port of higher exergy, as a rule the inlet
     * @param to the port of lower exergy
     */
    public static ExergyPurpose fuelDrop(Port from, Port to) {
        return DISSIPATIVE.withFuelDrop(from, to);
    }

    /**
     * {@return this purpose with the exergy at a port as fuel}
     *
     * @param port the port
     */
    public ExergyPurpose withFuel(Port port) {
        return new ExergyPurpose(append(fuel, new Term(port, null)), product);
    }

    /**
     * {@return this purpose with the drop of exergy from one port to another as fuel}
     *
     * @param from the port of higher exergy, as a rule the inlet
     * @param to the port of lower exergy
     */
    public ExergyPurpose withFuelDrop(Port from, Port to) {
        return new ExergyPurpose(append(fuel, new Term(from, to)), product);
    }

    /**
     * {@return this purpose with the exergy at a port as product}
     *
     * @param port the port
     */
    public ExergyPurpose withProduct(Port port) {
        return new ExergyPurpose(fuel, append(product, new Term(port, null)));
    }

    /**
     * {@return this purpose with the rise of exergy from one port to another as product}
     *
     * @param from the port of lower exergy, as a rule the inlet
     * @param to the port of higher exergy
     */
    public ExergyPurpose withProductRise(Port from, Port to) {
        return new ExergyPurpose(fuel, append(product, new Term(to, from)));
    }

    private static List<Term> append(List<Term> terms, Term term) {
        final List<Term> more = new ArrayList<>(terms);
        more.add(term);
        return List.copyOf(more);
    }

    /** {@return the terms of the fuel} */
    public List<Term> fuel() {
        return fuel;
    }

    /** {@return the terms of the product} */
    public List<Term> product() {
        return product;
    }

    /** {@return whether the component has neither fuel nor product} */
    public boolean isDissipative() {
        return fuel.isEmpty() && product.isEmpty();
    }
}
