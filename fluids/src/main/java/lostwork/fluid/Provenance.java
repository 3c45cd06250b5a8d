package lostwork.fluid;

import java.util.ArrayList;
import java.util.List;

/**
 * Where a property model comes from, and how good its publishers say it is.
 *
 * <pre>{@code
 * Provenance.of("perfect gas")
 *         .withSource("E. Clapeyron, Mémoire sur la puissance motrice de la chaleur (1834)", "from memory")
 *         .withRange("any temperature and pressure at which p v = R T is good enough")
 *         .withUncertainty("none published: it depends on the gas")
 *         .withDatum("h = 0 and s = 0 at 298.15 K and 1 bar");
 * }</pre>
 *
 * <p>Prints as an aligned block. Immutable and thread-safe.
 */
public final class Provenance {
    private static final String NOT_STATED = "not stated";

    private final String formulation;
    private final List<Source> sources;
    private final String range;
    private final String uncertainty;
    private final String datum;
    private final List<String> reservations;

    private Provenance(
            String formulation,
            List<Source> sources,
            String range,
            String uncertainty,
            String datum,
            List<String> reservations) {
        this.formulation = formulation;
        this.sources = sources;
        this.range = range;
        this.uncertainty = uncertainty;
        this.datum = datum;
        this.reservations = reservations;
    }

    /**
     * {@return a provenance that states nothing yet but the formulation}
     *
     * @param formulation the name of the equation or formulation
     */
    public static Provenance of(String formulation) {
        return new Provenance(formulation, List.of(), NOT_STATED, NOT_STATED, NOT_STATED, List.of());
    }

    /**
     * {@return a copy with one more source}
     *
     * @param citation author, title, edition, table or equation
     * @param origin how the figures came from there, such as {@code "read from the release"} or {@code "from memory,
     *     confirmed by the check values"}
     */
    public Provenance withSource(String citation, String origin) {
        return new Provenance(
                formulation, append(sources, new Source(citation, origin)), range, uncertainty, datum, reservations);
    }

    /**
     * {@return a copy with another range}
     *
     * @param range the validity range in words
     */
    public Provenance withRange(String range) {
        return new Provenance(formulation, sources, range, uncertainty, datum, reservations);
    }

    /**
     * {@return a copy with another uncertainty}
     *
     * @param uncertainty the published uncertainty in words; says so where none is published
     */
    public Provenance withUncertainty(String uncertainty) {
        return new Provenance(formulation, sources, range, uncertainty, datum, reservations);
    }

    /**
     * {@return a copy with another datum}
     *
     * @param datum where enthalpy and entropy are zero
     */
    public Provenance withDatum(String datum) {
        return new Provenance(formulation, sources, range, uncertainty, datum, reservations);
    }

    /**
     * {@return a copy with one more reservation}
     *
     * @param reservation what a careful user should know before relying on the figures
     */
    public Provenance withReservation(String reservation) {
        return new Provenance(formulation, sources, range, uncertainty, datum, append(reservations, reservation));
    }

    private static <E> List<E> append(List<E> list, E element) {
        final List<E> longer = new ArrayList<>(list);
        longer.add(element);
        return List.copyOf(longer);
    }

    /** {@return the name of the equation or formulation} */
    public String formulation() {
        return formulation;
    }

    /** {@return the citations of equations, coefficients and check values} */
    public List<Source> sources() {
        return sources;
    }

    /** {@return the validity range in words} */
    public String range() {
        return range;
    }

    /** {@return the published uncertainty in words} */
    public String uncertainty() {
        return uncertainty;
    }

    /** {@return where enthalpy and entropy are zero} */
    public String datum() {
        return datum;
    }

    /** {@return what a careful user should know before relying on the figures; often empty} */
    public List<String> reservations() {
        return reservations;
    }

    /** {@return the facts as an aligned block of lines} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder();
        line(text, "formulation", formulation);
        for (final Source source : sources) {
            line(text, "source", source.toString());
        }
        line(text, "range", range);
        line(text, "uncertainty", uncertainty);
        line(text, "datum", datum);
        for (final String reservation : reservations) {
            line(text, "reservation", reservation);
        }
        return text.substring(0, text.length() - 1);
    }

    private static void line(StringBuilder text, String label, String value) {
        text.append(label)
                .append(" ".repeat("formulation".length() + 2 - label.length()))
                .append(value)
                .append('\n');
    }

    /**
     * A citation, and how the figures came from there.
     *
     * @param citation author, title, edition, table or equation
     * @param origin how the figures came from there
     */
    public record Source(String citation, String origin) {
        /** {@return the citation with its origin in brackets} */
        @Override
        public String toString() {
            return citation + " [" + origin + "]";
        }
    }
}
