package lostwork.fluid;

import java.util.Locale;

/** A law that a property model breaks: which one, where, and by how much. Immutable and thread-safe. */
public final class FluidFinding {
    private final FluidLaw law;
    private final String detail;
    private final double temperature;
    private final double pressure;
    private final double deviation;
    private final double allowed;
    private final int places;

    FluidFinding(
            FluidLaw law,
            String detail,
            double temperature,
            double pressure,
            double deviation,
            double allowed,
            int places) {
        this.law = law;
        this.detail = detail;
        this.temperature = temperature;
        this.pressure = pressure;
        this.deviation = deviation;
        this.allowed = allowed;
        this.places = places;
    }

    /** {@return the law that is broken} */
    public FluidLaw law() {
        return law;
    }

    /** {@return the numbers of the worst place, or the message of a refusal} */
    public String detail() {
        return detail;
    }

    /** {@return the temperature of the worst place in K} */
    public double temperature() {
        return temperature;
    }

    /** {@return the absolute pressure of the worst place in Pa} */
    public double pressure() {
        return pressure;
    }

    /** {@return how far off the worst place is, relative; infinite where there is no number} */
    public double deviation() {
        return deviation;
    }

    /** {@return how far off it may be, relative} */
    public double allowed() {
        return allowed;
    }

    /** {@return at how many places the law is broken} */
    public int places() {
        return places;
    }

    /** {@return the finding in one line} */
    @Override
    public String toString() {
        return String.format(
                Locale.ROOT,
                "broken: %s; off by %.2g (allowed %.2g) at T = %.6g K, p = %.6g Pa, the worst of %d places: %s",
                law,
                deviation,
                allowed,
                temperature,
                pressure,
                places,
                detail);
    }
}
