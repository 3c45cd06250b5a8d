package lostwork.ledger;

import java.util.Optional;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/** The account of one component. Immutable. */
public final class ComponentExergy {
    private final String component;
    private final boolean dissipative;
    private final Power fuel;
    private final Power product;
    private final Power byBalance;
    private final Power byEntropy;

    ComponentExergy(
            String component, boolean dissipative, Power fuel, Power product, Power byBalance, Power byEntropy) {
        this.component = component;
        this.dissipative = dissipative;
        this.fuel = fuel;
        this.product = product;
        this.byBalance = byBalance;
        this.byEntropy = byEntropy;
    }

    /** {@return the name of the component} */
    public String component() {
        return component;
    }

    /** {@return the exergy that the component uses up; empty for a dissipative one} */
    public Optional<Power> fuel() {
        return dissipative ? Optional.empty() : Optional.of(fuel);
    }

    /** {@return the exergy that the component is there to make; empty for a dissipative one} */
    public Optional<Power> product() {
        return dissipative ? Optional.empty() : Optional.of(product);
    }

    /** {@return the exergy that the component destroys, by the exergy balance} */
    public Power destruction() {
        return byBalance;
    }

    /** {@return the exergy that the component destroys, as T₀ times the entropy that it generates} */
    public Power destructionByEntropy() {
        return byEntropy;
    }

    /** {@return the difference of the two books} */
    public Power difference() {
        return byBalance.minus(byEntropy);
    }

    /** {@return product over fuel; empty for a dissipative component and for one without fuel} */
    public Optional<Ratio> efficiency() {
        return dissipative || !(fuel.si() > 0) ? Optional.empty() : Optional.of(product.over(fuel));
    }

    /** {@return name, destruction and efficiency} */
    @Override
    public String toString() {
        return component + ": destroys " + destruction()
                + efficiency().map(e -> ", exergetic efficiency " + e).orElse("");
    }
}
