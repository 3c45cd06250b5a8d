package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lostwork.quantity.Duration;
import lostwork.quantity.EmissionFactor;
import lostwork.quantity.EnergyPrice;
import lostwork.quantity.LinearQuantity;
import lostwork.quantity.MassFlow;
import lostwork.quantity.MolarFlow;
import lostwork.quantity.NormalCondition;
import lostwork.quantity.Pressure;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.Ratio;
import lostwork.quantity.ScalarQuantity;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;
import lostwork.quantity.Unit;
import lostwork.quantity.UnreadableQuantityException;
import lostwork.quantity.VolumeFlow;

/**
 * A number with its unit, as a cell states it.
 *
 * <p>A cell that holds a number only takes the unit of its heading; a unit in the cell goes before the heading's.
 */
final class MeasuredCell {
    private static final String GAUGE = "(g)";

    private final double value;
    private final String written;
    private final String unit;

    private MeasuredCell(double value, String written, String unit) {
        this.value = value;
        this.written = written;
        this.unit = unit;
    }

    /**
     * {@return the number and unit of a cell}
     *
     * @param text the cell
     * @param headingUnit the unit in the heading; empty when the heading states none
     * @param style how the file writes numbers
     * @throws CellRefusedException if the cell does not hold a number
     */
    static MeasuredCell of(String text, String headingUnit, NumberStyle style) {
        if (text.isEmpty()) {
            throw new CellRefusedException("the cell is empty", "a number with its unit");
        }
        final NumberStyle.Leading number = style.leading(text);
        final String unit = number.rest().isEmpty() ? headingUnit : number.rest();
        return new MeasuredCell(number.value(), number.written(), unit);
    }

    Temperature temperature() {
        return quantity(Temperature.KIND);
    }

    TemperatureSpan uncertaintySpan() {
        return notNegative(quantity(TemperatureSpan.KIND));
    }

    Ratio percentage() {
        if (!unit.equals("%")) {
            throw unreadableUnit("percentage", "%");
        }
        return Ratio.percent(value);
    }

    Ratio relativeUncertainty() {
        final Ratio share = notNegative(percentage());
        if (!(share.inPercent() <= 100)) {
            throw new CellRefusedException(
                    "an uncertainty of " + this + " leaves nothing known", "a percentage from 0 % to 100 %");
        }
        return share;
    }

    /** {@return the hours per year; a number without a unit is in hours, as the heading says} */
    Duration hoursPerYear() {
        if (!unit.isEmpty() && !unit.equals("h") && !unit.equals("h/a")) {
            throw unreadableUnit("number of hours a year", "h, h/a or none");
        }
        if (!(value > 0 && value <= SurveyRules.HOURS_OF_A_YEAR)) {
            throw new CellRefusedException(
                    written + " hours a year" + (value > 0 ? " are more than a year has" : " are no time of operation"),
                    "above 0 and up to 8760 h");
        }
        return Duration.hours(value);
    }

    /**
     * {@return the absolute pressure}
     *
     * @param atmosphere what a gauge pressure is counted from
     */
    Pressure pressure(Pressure atmosphere) {
        final Pressure pressure;
        try {
            if (unit.endsWith(GAUGE)) {
                final String plain =
                        unit.substring(0, unit.length() - GAUGE.length()).strip();
                pressure = atmosphere.plus(read(PressureDifference.KIND, plain, gaugeUnits()));
            } else {
                pressure = read(Pressure.KIND, unit, symbols(Pressure.KIND) + " (absolute); " + gaugeUnits());
            }
        } catch (IllegalArgumentException e) {
            throw new CellRefusedException("a pressure of " + this + " does not exist", "an absolute pressure above 0");
        }
        if (!(pressure.si() > 0)) {
            throw new CellRefusedException(
                    "a pressure of " + this + " is no gas or liquid", "an absolute pressure above 0");
        }
        return pressure;
    }

    /** {@return the absolute pressure, where there is nothing yet to count a gauge pressure from} */
    Pressure absolutePressure() {
        if (!(value > 0)) {
            throw new CellRefusedException("a pressure of " + this + " does not exist", "an absolute pressure above 0");
        }
        return quantity(Pressure.KIND);
    }

    EmissionFactor emissionFactor() {
        return quantity(EmissionFactor.KIND);
    }

    /**
     * {@return the price per energy}
     *
     * @param currency the label of the currency, which the unit must start with
     */
    EnergyPrice energyPrice(String currency) {
        final String accepted = symbols(EnergyPrice.KIND).replace("¤", currency);
        if (!unit.startsWith(currency + "/")) {
            throw unreadableUnit("price in " + currency, accepted);
        }
        return read(EnergyPrice.KIND, "¤" + unit.substring(currency.length()), accepted);
    }

    private static String gaugeUnits() {
        final List<String> gauge = new ArrayList<>();
        for (Unit<PressureDifference> known : PressureDifference.KIND.units()) {
            gauge.add(known.symbol() + GAUGE);
        }
        return String.join(", ", gauge) + " (above the ambient pressure of the site file)";
    }

    /**
     * {@return the flow: of mass, of gas volume at a normal condition, or of volume at the supply state}
     *
     * @throws CellRefusedException if the unit is none of a flow, or the flow is not above zero
     */
    SurveyFlow flow() {
        final SurveyFlow flow = flowByUnit();
        if (!flow.isPositive()) {
            throw new CellRefusedException(
                    "the flow is " + (value < 0 ? "negative" : "zero") + ": " + this, "a flow above 0");
        }
        return flow;
    }

    private SurveyFlow flowByUnit() {
        final String[] words = unit.split("\\s+");
        if (words[0].matches("[NS]m(³|3)/h")) {
            return new SurveyFlow.ByNormalVolume(
                    MolarFlow.normalCubicMetresPerHour(value, condition(words[0])), condition(words[0]), basis(words));
        }
        if (isUnitOfVolumeFlow(unit)) {
            return new SurveyFlow.ByVolume(read(VolumeFlow.KIND, unit, flowUnits()));
        }
        return new SurveyFlow.ByMass(read(MassFlow.KIND, unit, flowUnits()));
    }

    private static boolean isUnitOfVolumeFlow(String symbol) {
        try {
            VolumeFlow.KIND.unit(symbol);
            return true;
        } catch (UnreadableQuantityException e) {
            return false;
        }
    }

    private static NormalCondition condition(String unit) {
        return unit.startsWith("N") ? NormalCondition.DIN_1343 : NormalCondition.ISO_13443;
    }

    private Optional<MoistureBasis> basis(String[] words) {
        if (words.length == 1) {
            return Optional.empty();
        }
        final String word = words[1].toLowerCase(Locale.ROOT);
        if (words.length > 2 || !(word.equals("wet") || word.equals("dry"))) {
            throw unreadableUnit("flow", flowUnits());
        }
        return Optional.of(word.equals("wet") ? MoistureBasis.WET : MoistureBasis.DRY);
    }

    private static String flowUnits() {
        return symbols(MassFlow.KIND) + "; Nm³/h wet, Nm³/h dry (counted at 0 °C, 101.325 kPa), Sm³/h wet, Sm³/h dry"
                + " (15 °C, 101.325 kPa); at the supply state " + symbols(VolumeFlow.KIND);
    }

    private <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> Q quantity(QuantityKind<Q, D> kind) {
        return read(kind, unit, symbols(kind));
    }

    private <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> Q read(
            QuantityKind<Q, D> kind, String symbol, String accepted) {
        if (symbol.isEmpty()) {
            throw unreadableUnit(kind.name(), accepted);
        }
        try {
            return kind.parse(value + " " + symbol);
        } catch (UnreadableQuantityException e) {
            throw unreadableUnit(kind.name(), accepted);
        } catch (IllegalArgumentException e) {
            throw new CellRefusedException("a " + kind.name() + " of " + this + " does not exist", "a possible value");
        }
    }

    private CellRefusedException unreadableUnit(String noun, String accepted) {
        return new CellRefusedException(
                unit.isEmpty()
                        ? "\"" + written + "\" has no unit, neither here nor in the heading"
                        : "the unit \"" + unit + "\" is none of a " + noun,
                accepted);
    }

    private <Q extends LinearQuantity<Q>> Q notNegative(Q uncertainty) {
        if (!(uncertainty.si() >= 0)) {
            throw new CellRefusedException("an uncertainty cannot be negative: " + this, "0 or more");
        }
        return uncertainty;
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> String symbols(
            QuantityKind<Q, D> kind) {
        final List<String> symbols = new ArrayList<>();
        for (Unit<Q> known : kind.units()) {
            symbols.add(known.symbol());
        }
        return String.join(", ", symbols);
    }

    @Override
    public String toString() {
        return unit.isEmpty() ? written : written + " " + unit;
    }
}
