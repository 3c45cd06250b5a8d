package lostwork.fluid;

import java.util.List;

/**
 * Tests whether a property model is consistent with itself and with the laws of thermodynamics.
 *
 * <p>A wrong derivative or an enthalpy that is not u + p v does not show in a table of properties; it shows as a plant that
 * does not converge or an exergy balance that does not close. This check compares the stated derivatives with differences,
 * the Maxwell relations, stability, the saturation line and every flash at several hundred places that fill the range
 * evenly. It says nothing about how well the model matches nature.
 *
 * <pre>{@code
 * System.out.println(FluidCheck.of(myModel));
 * }</pre>
 *
 * <p>The places are always the same, so the result is reproducible. Immutable and thread-safe.
 */
public final class FluidCheck {
    private final String fluid;
    private final List<FluidFinding> findings;
    private final int places;

    private FluidCheck(String fluid, List<FluidFinding> findings, int places) {
        this.fluid = fluid;
        this.findings = findings;
        this.places = places;
    }

    /**
     * {@return the check of a model that is meant to be exact}
     *
     * @param model the model
     */
    public static FluidCheck of(FluidModel model) {
        return of(model, FluidTolerance.exact());
    }

    /**
     * {@return the check of a model}
     *
     * @param model the model
     * @param tolerance how exactly it must keep the laws
     */
    public static FluidCheck of(FluidModel model, FluidTolerance tolerance) {
        final Findings findings = new Findings();
        final int places = new SinglePhaseCheck(model, tolerance, findings).run();
        final int onLine = new SaturationCheck(model, tolerance, findings).run();
        return new FluidCheck(model.name(), findings.list(), places + onLine);
    }

    /** {@return one finding for each law that is broken, at its worst place; empty for a consistent model} */
    public List<FluidFinding> findings() {
        return findings;
    }

    /** {@return whether no law is broken} */
    public boolean isConsistent() {
        return findings.isEmpty();
    }

    /** {@return at how many places the model was tested} */
    public int places() {
        return places;
    }

    /** {@return the findings, one a line} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder(fluid)
                .append(": ")
                .append(findings.isEmpty() ? "consistent" : findings.size() + " laws broken")
                .append(" at ")
                .append(places)
                .append(" places");
        for (final FluidFinding finding : findings) {
            text.append("\n  ").append(finding);
        }
        return text.toString();
    }
}
