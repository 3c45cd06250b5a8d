package lostwork.plant;

/** A port where heat leaves a component. */
public final class HeatOutlet extends HeatPort {
    HeatOutlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return false;
    }
}
