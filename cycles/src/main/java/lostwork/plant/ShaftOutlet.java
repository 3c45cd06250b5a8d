package lostwork.plant;

/** A port where mechanical power leaves a component. */
public final class ShaftOutlet extends ShaftPort {
    ShaftOutlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return false;
    }
}
