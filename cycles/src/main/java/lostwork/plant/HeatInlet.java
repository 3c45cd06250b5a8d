package lostwork.plant;

/** A port where heat enters a component. */
public final class HeatInlet extends HeatPort {
    HeatInlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return true;
    }
}
