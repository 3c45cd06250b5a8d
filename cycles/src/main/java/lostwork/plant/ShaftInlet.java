package lostwork.plant;

/** A port where mechanical power enters a component. */
public final class ShaftInlet extends ShaftPort {
    ShaftInlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return true;
    }
}
