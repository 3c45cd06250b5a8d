package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FluidState;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;

/** Computes the figures of one stream against the ambient of a site. */
final class StreamAnalysis {
    private final Site site;
    private final ReferenceEnvironment ambient;

    StreamAnalysis(Site site) {
        this.site = site;
        this.ambient = ReferenceEnvironment.of(site.ambientTemperature(), site.ambientPressure())
                .withRelativeHumidity(site.relativeHumidity());
    }

    /**
     * {@return the figures of a stream}
     *
     * @param stream the stream
     * @throws CellRefusedException if the medium cannot be in the stated state
     * @throws lostwork.quantity.OutOfRangeException if a state lies outside the range of the property model
     */
    StreamFigures of(SurveyLine stream) {
        final StreamFluid medium = StreamFluid.of(stream, site);
        final FluidState supply = medium.supplyState(stream);
        final MassFlow flow = medium.massFlow(stream.flow(), supply);
        final Power exergy = ambient.flowExergy(supply).times(flow);
        final Temperature lowest = higher(stream.lowest(), ambient.temperature());
        final List<String> notes = new ArrayList<>();
        if (stream.supply().compareTo(lowest) <= 0) {
            notes.add(nothingToWin(stream));
            return new StreamFigures(
                    stream,
                    medium.label(),
                    flow,
                    stream.supply(),
                    exergy,
                    Estimate.ZERO,
                    Estimate.ZERO,
                    Estimate.ZERO,
                    notes);
        }
        if (lowest.compareTo(stream.lowest()) > 0) {
            notes.add("counted down to the ambient " + lowest + " only, not to " + stream.lowest()
                    + ": cooling below ambient takes work");
        }
        condensation(medium, stream, lowest).ifPresent(notes::add);
        final CoolingPath path = new CoolingPath(medium.fluid(), stream.pressure(), lowest, ambient);
        return new StreamFigures(
                stream,
                medium.label(),
                flow,
                lowest,
                exergy,
                estimate(stream, flow, path::heatFrom),
                estimate(stream, flow, path::reversibleWorkFrom),
                estimate(stream, flow, path::endoreversibleWorkFrom),
                notes);
    }

    private String nothingToWin(SurveyLine stream) {
        final int toAmbient = stream.supply().compareTo(ambient.temperature());
        if (toAmbient < 0) {
            return "supply is colder than the ambient " + ambient.temperature()
                    + ": no heat to win; its exergy is that of cold and could spare refrigeration";
        }
        if (toAmbient == 0) {
            return "supply is at the ambient temperature: no heat to win";
        }
        return "lowest allowed temperature equals the supply: no heat to win";
    }

    private static Optional<String> condensation(StreamFluid medium, SurveyLine stream, Temperature lowest) {
        return medium.waterDewPoint(stream.pressure())
                .filter(dewPoint -> dewPoint.compareTo(lowest) > 0)
                .map(dewPoint -> "water condenses below " + Decimals.fixed(dewPoint.inCelsius(), 0)
                        + " °C; its heat of condensation is not counted");
    }

    /** {@return a figure and its range, after the rule in {@link AuditRules#UNCERTAINTY}} */
    private static Estimate estimate(SurveyLine stream, MassFlow flow, Function<Temperature, SpecificEnergy> perMass) {
        final Power value = perMass.apply(stream.supply()).times(flow);
        final Power above = perMass.apply(stream.supply().plus(stream.temperatureUncertainty()))
                .times(flow);
        final Power below = perMass.apply(stream.supply().minus(stream.temperatureUncertainty()))
                .times(flow);
        final double ofFlow = value.si() * stream.flowUncertainty().inFraction();
        final double ofTemperature = (above.si() - below.si()) / 2;
        return new Estimate(value, Power.watts(Math.hypot(ofFlow, ofTemperature)));
    }

    private static Temperature higher(Temperature a, Temperature b) {
        return a.compareTo(b) >= 0 ? a : b;
    }
}
