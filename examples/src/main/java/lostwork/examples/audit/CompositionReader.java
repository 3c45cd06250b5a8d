package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import lostwork.examples.audit.Medium.AirSupply;
import lostwork.examples.audit.Medium.Component;
import lostwork.quantity.Ratio;

/**
 * Reads the composition cell of a stream, whose form depends on the medium:
 *
 * <pre>
 * humid air     relative humidity 60 % at 25 °C   |   humidity ratio 12 g/kg
 * flue gas      natural gas with 18 % excess air  |   natural gas with 3.5 % O2 dry
 * gas mixture   N2 72 % + CO2 14 % + H2O 11 % + O2 3 %
 * </pre>
 */
final class CompositionReader {
    private static final String HUMIDITY = "\"relative humidity 60 % at 25 °C\" or \"humidity ratio 12 g/kg\""
            + " (mass of vapour per mass of dry air)";
    private static final String COMBUSTION =
            "\"natural gas with 18 % excess air\" or" + " \"natural gas with 3.5 % O2 dry\" or \"... O2 wet\"";
    private static final String MIXTURE =
            "mole percents of the gas as it flows, such as \"N2 72 % + CO2 14 % + H2O 11 % + O2 3 %\"";

    private final NumberStyle style;

    CompositionReader(NumberStyle style) {
        this.style = style;
    }

    /**
     * {@return the medium of a stream}
     *
     * @param name the kind of medium that the survey names
     * @param composition the composition cell, which may be empty
     * @throws CellRefusedException if the composition cannot be read or does not fit the medium
     */
    Medium read(MediumName name, String composition) {
        return switch (name) {
            case DRY_AIR -> withoutComposition(new Medium.DryAir(), composition);
            case WATER -> withoutComposition(new Medium.LiquidWater(), composition);
            case HUMID_AIR -> new Medium.HumidAir(humidity(composition));
            case FLUE_GAS -> flueGas(composition);
            case GAS_MIXTURE -> mixture(composition);
        };
    }

    private static Medium withoutComposition(Medium medium, String composition) {
        if (!composition.isEmpty()) {
            throw new CellRefusedException(
                    medium.label() + " takes no composition, but \"" + composition + "\" is given", "an empty cell");
        }
        return medium;
    }

    private Medium.Humidity humidity(String text) {
        final String plain = Vocabulary.plain(text);
        if (plain.startsWith("relative humidity ")) {
            return relativeHumidity(text.strip().substring("relative humidity ".length()));
        }
        if (plain.startsWith("humidity ratio ")) {
            return humidityRatio(text.strip().substring("humidity ratio ".length()));
        }
        throw new CellRefusedException(
                text.isEmpty() ? "the humidity of the air is not stated" : "\"" + text + "\" is no humidity", HUMIDITY);
    }

    private Medium.Humidity relativeHumidity(String text) {
        final int at = text.indexOf(" at ");
        if (at < 0) {
            throw new CellRefusedException("the temperature of the relative humidity is not stated", HUMIDITY);
        }
        final Ratio share =
                MeasuredCell.of(text.substring(0, at).strip(), "", style).percentage();
        requireRelativeHumidity(share);
        return new Medium.RelativeHumidity(
                share,
                MeasuredCell.of(text.substring(at + 4).strip(), "", style).temperature());
    }

    static void requireRelativeHumidity(Ratio share) {
        if (!(share.si() >= 0 && share.si() <= 1)) {
            throw new CellRefusedException(
                    "a relative humidity of " + Decimals.shortest(share.inPercent()) + " % does not exist",
                    "0 % to 100 %");
        }
    }

    private Medium.Humidity humidityRatio(String text) {
        final NumberStyle.Leading number = style.leading(text);
        final double perUnit = switch (number.rest()) {
            case "g/kg" -> 1e-3;
            case "kg/kg" -> 1;
            default ->
                throw new CellRefusedException(
                        "the unit \"" + number.rest() + "\" is none of a humidity ratio", "g/kg, kg/kg");
        };
        final double ratio = number.value() * perUnit;
        if (!(ratio >= 0 && ratio <= 10)) {
            throw new CellRefusedException(
                    "a humidity ratio of " + text + " is out of range", "0 g/kg to 10 kg/kg of dry air");
        }
        return new Medium.HumidityRatio(Ratio.fraction(ratio));
    }

    private Medium flueGas(String text) {
        final int with = text.toLowerCase(Locale.ROOT).indexOf(" with ");
        if (with < 0) {
            throw new CellRefusedException(
                    text.isEmpty()
                            ? "the fuel and the air of the flue gas are not stated"
                            : "\"" + text + "\" does not say how much air burnt the fuel",
                    COMBUSTION);
        }
        final SurveyFuel fuel = SurveyFuel.vocabulary().meaningOf(text.substring(0, with));
        final NumberStyle.Leading number =
                style.leading(text.substring(with + 6).strip());
        final String words = Vocabulary.plain(number.rest());
        if (!words.startsWith("%")) {
            throw new CellRefusedException("\"" + text + "\" states no percentage", COMBUSTION);
        }
        return new Medium.FlueGas(fuel, airSupply(number, words.substring(1).strip()));
    }

    private static AirSupply airSupply(NumberStyle.Leading number, String words) {
        final double percent = number.value();
        switch (words) {
            case "excess air":
                if (!(percent >= 0 && percent <= 5000)) {
                    throw new CellRefusedException(
                            "an excess air of " + number.written() + " % is out of range", "0 % to 5000 %");
                }
                return new Medium.ExcessAir(Ratio.percent(percent));
            case "o2":
                throw new CellRefusedException(
                        "it is not stated whether the " + number.written() + " % O2 were measured wet or dry",
                        "\"" + number.written() + " % O2 dry\" (analyser behind a gas cooler) or \"" + number.written()
                                + " % O2 wet\" (probe in the hot gas)");
            case "o2 dry":
                return new Medium.MeasuredOxygen(oxygen(number), MoistureBasis.DRY);
            case "o2 wet":
                return new Medium.MeasuredOxygen(oxygen(number), MoistureBasis.WET);
            default:
                throw new CellRefusedException("\"" + words + "\" is neither excess air nor O2", COMBUSTION);
        }
    }

    private static Ratio oxygen(NumberStyle.Leading number) {
        if (!(number.value() >= 0 && number.value() <= 20.5)) {
            throw new CellRefusedException(
                    number.written() + " % O2 is out of range for a flue gas", "0 % to 20.5 %, below that of air");
        }
        return Ratio.percent(number.value());
    }

    private Medium mixture(String text) {
        if (text.isEmpty()) {
            throw new CellRefusedException("the composition of the gas mixture is not stated", MIXTURE);
        }
        final Set<SurveyGas> named = EnumSet.noneOf(SurveyGas.class);
        final List<SurveyGas> gases = new ArrayList<>();
        final List<Double> percents = new ArrayList<>();
        double sum = 0;
        for (String part : text.split("\\+")) {
            final String[] words = part.strip().split("\\s+", 2);
            if (words.length < 2) {
                throw new CellRefusedException("\"" + part.strip() + "\" is no gas with its mole percent", MIXTURE);
            }
            final SurveyGas gas = SurveyGas.vocabulary().meaningOf(words[0]);
            if (!named.add(gas)) {
                throw new CellRefusedException(gas.formula() + " is named twice", MIXTURE);
            }
            final double percent = molePercent(words[1]);
            gases.add(gas);
            percents.add(percent);
            sum += percent;
        }
        if (!(Math.abs(sum - 100) <= SurveyRules.COMPOSITION_TOLERANCE_PERCENT)) {
            throw new CellRefusedException(
                    "the mole percents sum to " + Decimals.shortest(sum) + " %",
                    "a sum of 100 % within " + Decimals.shortest(SurveyRules.COMPOSITION_TOLERANCE_PERCENT) + " %");
        }
        final List<Component> components = new ArrayList<>();
        for (int i = 0; i < gases.size(); i++) {
            components.add(new Component(gases.get(i), Ratio.fraction(percents.get(i) / sum)));
        }
        return new Medium.GasMixture(components);
    }

    private double molePercent(String text) {
        final NumberStyle.Leading number = style.leading(text);
        if (!number.rest().equals("%")) {
            throw new CellRefusedException("\"" + text + "\" is no mole percent", MIXTURE);
        }
        if (!(number.value() >= 0 && number.value() <= 100)) {
            throw new CellRefusedException("a mole percent of " + text + " does not exist", "0 % to 100 %");
        }
        return number.value();
    }
}
