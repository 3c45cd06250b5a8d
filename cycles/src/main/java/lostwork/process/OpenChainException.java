package lostwork.process;

import java.util.Locale;
import lostwork.fluid.FluidState;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.TemperatureSpan;

/** Thrown when a chain of steps is taken for a cycle but does not come back to its start; it tells by how much. */
public final class OpenChainException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** End less start. */
    private final TemperatureSpan temperatureGap;
    /** End less start. */
    private final PressureDifference pressureGap;
    /** End less start. */
    private final SpecificVolume volumeGap;

    OpenChainException(FluidState start, FluidState end, double relativeGap, String wayOut) {
        super("the chain does not close: it starts at " + point(start) + " and ends at " + point(end)
                + String.format(Locale.ROOT, ", relative gap %.3g", relativeGap) + "; " + wayOut);
        temperatureGap = end.temperature().minus(start.temperature());
        pressureGap = end.pressure().minus(start.pressure());
        volumeGap = end.volume().minus(start.volume());
    }

    static String point(FluidState state) {
        return state.temperature() + ", " + state.pressure() + ", " + state.volume();
    }

    /** {@return the temperature at the end less the one at the start} */
    public TemperatureSpan temperatureGap() {
        return temperatureGap;
    }

    /** {@return the pressure at the end less the one at the start} */
    public PressureDifference pressureGap() {
        return pressureGap;
    }

    /** {@return the specific volume at the end less the one at the start} */
    public SpecificVolume volumeGap() {
        return volumeGap;
    }
}
