package lostwork.plant;

/** A port where electric power leaves a component. */
public final class WireOutlet extends WirePort {
    WireOutlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return false;
    }
}
