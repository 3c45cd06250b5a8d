package lostwork.fluid.gas;

import java.util.List;

/** Thrown when no species of a name is known; the message lists names near it. */
public final class UnknownSpeciesException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    /** The name asked for. */
    private final String name;
    /** Known names near it. */
    private final String[] near;

    UnknownSpeciesException(String name, List<String> near) {
        super("no species is named '" + name + "'; "
                + (near.isEmpty() ? "Species.all() lists the known ones" : "near names: " + String.join(", ", near)));
        this.name = name;
        this.near = near.toArray(String[]::new);
    }

    /** {@return the name asked for} */
    public String name() {
        return name;
    }

    /** {@return known names near it, nearest first, each with its description} */
    public List<String> near() {
        return List.of(near);
    }
}
