package lostwork.quantity;

import javax.measure.Quantity;
import javax.measure.Unit;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.quantity.Quantities;
import tech.units.indriya.unit.Units;

/** The way to and from JSR-385 quantities, loaded only when it is used. */
final class JsrBridge {
    private JsrBridge() {}

    static Quantity<?> toQuantity(double si, Dimension dimension) {
        return Quantities.getQuantity(si, unitOf(dimension));
    }

    static double toSi(Quantity<?> quantity, QuantityKind<?, ?> kind) {
        final Unit<?> wanted = unitOf(kind.dimension());
        try {
            return quantity.getUnit()
                    .getConverterToAny(wanted)
                    .convert(quantity.getValue().doubleValue());
        } catch (javax.measure.IncommensurableException | javax.measure.UnconvertibleException e) {
            throw new IllegalArgumentException(
                    quantity + " is no " + kind.name() + ": its unit must convert to " + wanted, e);
        }
    }

    private static Unit<?> unitOf(Dimension d) {
        if (d.money() != 0) {
            throw new IllegalArgumentException("JSR-385 has no unit of money");
        }
        Unit<?> unit = AbstractUnit.ONE;
        unit = unit.multiply(Units.METRE.pow(d.length()));
        unit = unit.multiply(Units.KILOGRAM.pow(d.mass()));
        unit = unit.multiply(Units.SECOND.pow(d.time()));
        unit = unit.multiply(Units.KELVIN.pow(d.temperature()));
        return unit.multiply(Units.MOLE.pow(d.amount()));
    }
}
