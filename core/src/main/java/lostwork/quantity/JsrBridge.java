package lostwork.quantity;

import java.util.Map;
import javax.measure.IncommensurableException;
import javax.measure.Quantity;
import javax.measure.Quantity.Scale;
import javax.measure.UnconvertibleException;
import javax.measure.Unit;
import javax.measure.UnitConverter;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.quantity.Quantities;
import tech.units.indriya.unit.Units;

/** The way to and from JSR-385 quantities; this class and Indriya are loaded only when it is used. */
final class JsrBridge {
    private JsrBridge() {}

    static Quantity<?> toQuantity(double si, QuantityKind<?, ?> kind) {
        return Quantities.getQuantity(si, coherentUnit(kind), scale(kind));
    }

    static <U extends Quantity<U>> Quantity<U> toQuantity(double si, QuantityKind<?, ?> kind, Unit<U> unit) {
        final UnitConverter converter = converter(coherentUnit(kind), unit, kind);
        return Quantities.getQuantity(convert(converter, si, kind.isLinear()), unit, scale(kind));
    }

    static double toSi(Quantity<?> quantity, QuantityKind<?, ?> kind) {
        final UnitConverter converter = converter(quantity.getUnit(), coherentUnit(kind), kind);
        final boolean relative = quantity.getScale() == Scale.RELATIVE;
        if (relative && !kind.isLinear()) {
            throw new IllegalArgumentException(quantity + " is a difference (its scale is relative) and no "
                    + kind.name() + ": read it as the kind " + kind.difference().name() + " instead");
        }
        if (!relative && kind.isLinear() && !converter.isLinear()) {
            throw new IllegalArgumentException(quantity + " is a point on a scale with a zero of its own and no "
                    + kind.name() + ": give it a relative scale or a unit such as "
                    + kind.coherentUnit().symbol());
        }
        return convert(converter, quantity.getValue().doubleValue(), kind.isLinear());
    }

    /** Converts a point, or a difference, for which only the linear steps count: the zero of the scale plays no part. */
    private static double convert(UnitConverter converter, double value, boolean difference) {
        if (!difference) {
            return converter.convert(value);
        }
        double converted = value;
        for (UnitConverter step : converter.getConversionSteps()) {
            converted = step.isLinear() ? step.convert(converted) : converted;
        }
        return converted;
    }

    /** A span of temperatures leaves with the scale that says so, or a conversion to °C would shift it. */
    private static Scale scale(QuantityKind<?, ?> kind) {
        return kind.isLinear() && kind.dimension().equals(Dimension.TEMPERATURE) ? Scale.RELATIVE : Scale.ABSOLUTE;
    }

    private static UnitConverter converter(Unit<?> from, Unit<?> to, QuantityKind<?, ?> kind) {
        final boolean countsLight = kind.dimension().luminousIntensity() != 0;
        if (!countsLight && (countsAngles(from) || countsAngles(to))) {
            throw new IllegalArgumentException(
                    kind.name() + " does not convert between " + from + " and " + to
                            + ": angles count as plain numbers in SI, so a revolution and a radian would be taken for the same");
        }
        try {
            return from.getConverterToAny(to);
        } catch (IncommensurableException | UnconvertibleException e) {
            throw new IllegalArgumentException(
                    kind.name() + " does not convert between " + from + " and " + to + ": its dimension is "
                            + kind.dimension(),
                    e);
        }
    }

    private static boolean countsAngles(Unit<?> unit) {
        if (unit.equals(Units.RADIAN) || unit.equals(Units.STERADIAN)) {
            return true;
        }
        final Map<? extends Unit<?>, Integer> factors = unit.getBaseUnits();
        return factors != null && factors.keySet().stream().anyMatch(f -> !f.equals(unit) && countsAngles(f));
    }

    private static Unit<?> coherentUnit(QuantityKind<?, ?> kind) {
        final Dimension d = kind.dimension();
        if (d.money() != 0) {
            throw new UnsupportedOperationException("JSR-385 has no unit of money, so there is no unit for "
                    + kind.name() + ": read the number with in(unit) instead");
        }
        Unit<?> unit = AbstractUnit.ONE;
        unit = unit.multiply(Units.METRE.pow(d.length()));
        unit = unit.multiply(Units.KILOGRAM.pow(d.mass()));
        unit = unit.multiply(Units.SECOND.pow(d.time()));
        unit = unit.multiply(Units.AMPERE.pow(d.electricCurrent()));
        unit = unit.multiply(Units.KELVIN.pow(d.temperature()));
        unit = unit.multiply(Units.MOLE.pow(d.amount()));
        return unit.multiply(Units.CANDELA.pow(d.luminousIntensity()));
    }
}
