package lostwork.plant;

import java.util.List;

/** Thrown when a plant is built in a way that has no meaning; the message says what and names the parts. */
public final class PlantException extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    /** What is wrong, one sentence each. */
    private final List<String> findings;

    PlantException(String plant, List<String> findings) {
        super("plant \"" + plant + "\": " + String.join("\n  ", findings));
        this.findings = List.copyOf(findings);
    }

    /** {@return what is wrong, one sentence each} */
    public List<String> findings() {
        return findings;
    }
}
