package lostwork.plant;

/** A port where a stream leaves a component. */
public final class Outlet extends MaterialPort {
    Outlet(String component, String name) {
        super(component, name);
    }

    @Override
    public boolean isInlet() {
        return false;
    }
}
