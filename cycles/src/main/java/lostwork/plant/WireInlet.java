package lostwork.plant;

/** A port where electric power enters a component. */
public final class WireInlet extends WirePort {
    WireInlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return true;
    }
}
