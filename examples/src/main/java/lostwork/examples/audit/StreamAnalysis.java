package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FluidState;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Temperature;

/** Computes the figures of one stream against the ambient of a site. */
final class StreamAnalysis {
    private final Site site;
    private final ReferenceEnvironment ambient;

    StreamAnalysis(Site site) {
        this.site = site;
        this.ambient = site.ambient();
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
        final Optional<Power> exergy = exergy(supply, flow);
        final Temperature lowest = higher(stream.lowest(), ambient.temperature());
        final List<String> notes = new ArrayList<>();
        if (exergy.isEmpty()) {
            notes.add("exergy not given: the model of " + medium.label() + " does not reach the ambient "
                    + ambient.temperature());
        }
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
        final CoolingPath path = new CoolingPath(medium.fluid(), stream.pressure(), stream.supply(), lowest, ambient);
        return new StreamFigures(
                stream,
                medium.label(),
                flow,
                lowest,
                exergy,
                estimate(stream, flow, path.heat()),
                estimate(stream, flow, path.reversibleWork()),
                estimate(stream, flow, path.endoreversibleWork()),
                notes);
    }

    /** {@return the flow exergy; empty where the model does not hold at the ambient, as for liquid water in frost} */
    private Optional<Power> exergy(FluidState supply, MassFlow flow) {
        if (!supply.fluid()
                .range()
                .contains(ambient.temperature().si(), ambient.pressure().si())) {
            return Optional.empty();
        }
        return Optional.of(ambient.flowExergy(supply).times(flow));
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
    private static Estimate estimate(SurveyLine stream, MassFlow flow, CoolingPath.Yield yield) {
        final Power value = yield.value().times(flow);
        final Power ofFlow = value.times(stream.flowUncertainty());
        final Power ofTemperature =
                yield.perKelvin().times(stream.temperatureUncertainty()).times(flow);
        return new Estimate(value, Power.watts(Math.hypot(ofFlow.si(), ofTemperature.si())));
    }

    private static Temperature higher(Temperature a, Temperature b) {
        return a.compareTo(b) >= 0 ? a : b;
    }
}
