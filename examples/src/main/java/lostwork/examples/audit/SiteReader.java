package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import lostwork.quantity.EmissionFactor;
import lostwork.quantity.EnergyPrice;
import lostwork.quantity.LinearQuantity;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * Reads a site file: lines of the form {@code key = value}; blank lines and lines that start with {@code #} are skipped.
 *
 * <p>Every figure of the report depends on the site, so one bad line is enough to refuse the file; all bad lines are
 * named at once.
 */
final class SiteReader {
    private final SourceText source;
    private final List<Problem> problems = new ArrayList<>();
    private final Map<SiteKey, Value> values = new EnumMap<>(SiteKey.class);

    /**
     * The text of a value.
     *
     * @param text the text, without outer blanks
     * @param line its line
     * @param column where it starts in the line, from 1
     */
    private record Value(String text, int line, int column) {}

    private SiteReader(SourceText source) {
        this.source = source;
    }

    /**
     * {@return the site that a file describes}
     *
     * @param source the text of the file
     * @throws RefusedInputException if a key is missing, doubled or unknown, or a value cannot be read
     */
    static Site read(SourceText source) {
        return new SiteReader(source).read();
    }

    private Site read() {
        problems.addAll(source.problems());
        for (SourceText.Line line : source.lines()) {
            if (!line.text().isBlank() && !line.text().startsWith("#")) {
                add(line);
            }
        }
        if (values.isEmpty() && problems.isEmpty()) {
            throw new RefusedInputException(Problem.ofFile(source.name(), "the file is empty", allKeys()));
        }
        for (SiteKey key : SiteKey.values()) {
            if (!values.containsKey(key)) {
                problems.add(Problem.ofFile(source.name(), "the key \"" + key.key() + "\" is missing", allKeys()));
            }
        }
        final Optional<String> name = value(SiteKey.SITE, SiteReader::notEmpty);
        final Optional<Temperature> temperature =
                value(SiteKey.AMBIENT_TEMPERATURE, text -> measured(text).temperature());
        final Optional<Pressure> pressure = value(SiteKey.AMBIENT_PRESSURE, SiteReader::absolutePressure);
        final Optional<Ratio> humidity = value(SiteKey.RELATIVE_HUMIDITY, SiteReader::relativeHumidity);
        final Optional<String> currency = value(SiteKey.CURRENCY, SiteReader::notEmpty);
        final Optional<EnergyPrice> power = currency.flatMap(label -> price(SiteKey.POWER_PRICE, label));
        final Optional<EnergyPrice> heat = currency.flatMap(label -> price(SiteKey.HEAT_PRICE, label));
        final Optional<EmissionFactor> carbon = value(
                SiteKey.GRID_CARBON_INTENSITY,
                text -> notNegative(measured(text).emissionFactor(), text));
        if (!problems.isEmpty()) {
            problems.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
            final List<String> texts = new ArrayList<>();
            problems.forEach(problem -> texts.add(problem.toString()));
            throw new RefusedInputException(String.join(System.lineSeparator(), texts));
        }
        return new Site(
                name.orElseThrow(),
                temperature.orElseThrow(),
                pressure.orElseThrow(),
                humidity.orElseThrow(),
                currency.orElseThrow(),
                power.orElseThrow(),
                heat.orElseThrow(),
                carbon.orElseThrow());
    }

    private void add(SourceText.Line line) {
        final int equals = line.text().indexOf('=');
        if (equals < 0) {
            problems.add(new Problem(
                    source.name(),
                    line.number(),
                    1,
                    "the line has no \"=\"",
                    "key = value, with the keys " + allKeys()));
            return;
        }
        final SiteKey key;
        try {
            key = SiteKey.vocabulary()
                    .meaningOf(line.text().substring(0, equals).strip());
        } catch (CellRefusedException e) {
            problems.add(new Problem(source.name(), line.number(), 1, e.what(), e.accepted()));
            return;
        }
        int start = equals + 1;
        while (start < line.text().length()
                && Character.isWhitespace(line.text().charAt(start))) {
            start++;
        }
        final Value value = new Value(line.text().substring(start).strip(), line.number(), start + 1);
        final Value first = values.putIfAbsent(key, value);
        if (first != null) {
            problems.add(new Problem(
                    source.name(),
                    line.number(),
                    1,
                    "the key \"" + key.key() + "\" is already given in line " + first.line(),
                    "each key once"));
        }
    }

    private <T> Optional<T> value(SiteKey key, Function<String, T> reading) {
        final Value value = values.get(key);
        if (value == null) {
            return Optional.empty();
        }
        try {
            return Optional.of(reading.apply(value.text()));
        } catch (CellRefusedException e) {
            problems.add(new Problem(
                    source.name(), value.line(), value.column(), key.key() + ": " + e.what(), e.accepted()));
            return Optional.empty();
        }
    }

    private Optional<EnergyPrice> price(SiteKey key, String currency) {
        return value(key, text -> notNegative(measured(text).energyPrice(currency), text));
    }

    private static MeasuredCell measured(String text) {
        return MeasuredCell.of(text, "", NumberStyle.decimalPoint());
    }

    private static String notEmpty(String text) {
        if (text.isEmpty()) {
            throw new CellRefusedException("the value is empty", "some text");
        }
        return text;
    }

    private static Pressure absolutePressure(String text) {
        return measured(text).absolutePressure();
    }

    private static Ratio relativeHumidity(String text) {
        final Ratio share = measured(text).percentage();
        CompositionReader.requireRelativeHumidity(share);
        return share;
    }

    private static <Q extends LinearQuantity<Q>> Q notNegative(Q value, String text) {
        if (!(value.si() >= 0)) {
            throw new CellRefusedException("\"" + text + "\" is negative", "0 or more");
        }
        return value;
    }

    private static String allKeys() {
        return String.join(", ", SiteKey.vocabulary().words());
    }
}
