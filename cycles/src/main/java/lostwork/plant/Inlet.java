package lostwork.plant;

/** A port where a stream enters a component. */
public final class Inlet extends MaterialPort {
    Inlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return true;
    }
}
