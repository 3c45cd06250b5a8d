package lostwork.plant;

/** A place where a component touches its surroundings: a stream, a shaft, a wire or a flow of heat. */
public abstract class Port {
    private final String component;
    private final String name;

    Port(String component, String name) {
        this.component = component;
        this.name = name;
    }

    /** {@return the name of the component that the port belongs to} */
    public final String component() {
        return component;
    }

    /** {@return the name of the port within its component} */
    public final String name() {
        return name;
    }

    /** {@return whether what passes the port enters its component} */
    public abstract boolean isInlet();

    /** {@return component and name, such as {@code turbine inlet}} */
    @Override
    public final String toString() {
        return component + " " + name;
    }
}
