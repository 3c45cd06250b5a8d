package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import javax.measure.MetricPrefix;
import javax.measure.Quantity;
import javax.measure.Quantity.Scale;
import org.junit.jupiter.api.Test;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.quantity.Quantities;
import tech.units.indriya.unit.Units;

/** The bridge to JSR-385, both ways. */
class JsrBridgeTest {
    @Test
    void anyUnitOfTheDimensionComesIn() {
        assertEquals(Temperature.celsius(25), Temperature.of(Quantities.getQuantity(25, Units.CELSIUS)));
        assertEquals(
                Pressure.bar(3.5),
                Pressure.of(Quantities.getQuantity(new BigDecimal("0.35"), MetricPrefix.MEGA(Units.PASCAL))));
        assertEquals(
                Energy.kilowattHours(2),
                Energy.of(
                        Quantities.getQuantity(2, MetricPrefix.KILO(Units.WATT).multiply(Units.HOUR))));
        assertEquals(Ratio.percent(88), Ratio.of(Quantities.getQuantity(88, Units.PERCENT)));
        assertEquals(
                SpecificEnergy.joulesPerKilogram(450),
                SpecificEnergy.of(Quantities.getQuantity(450, Units.METRE.pow(2).divide(Units.SECOND.pow(2)))));
    }

    @Test
    void anotherDimensionIsRefused() {
        final var mass = Quantities.getQuantity(1, Units.KILOGRAM);
        final var e = assertThrows(IllegalArgumentException.class, () -> Pressure.of(mass));
        assertTrue(e.getMessage().startsWith("pressure does not convert between kg and "), e.getMessage());
        assertThrows(
                IllegalArgumentException.class, () -> Temperature.celsius(25).asQuantity(Units.METRE));
    }

    @Test
    void pointsAndDifferencesStayApart() {
        final var absolute = Quantities.getQuantity(20, Units.CELSIUS);
        final var relative = Quantities.getQuantity(20, Units.CELSIUS, Scale.RELATIVE);
        assertEquals(TemperatureSpan.kelvins(20), TemperatureSpan.of(relative));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> TemperatureSpan.of(absolute))
                .getMessage()
                .contains("relative scale"));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> Temperature.of(relative))
                .getMessage()
                .contains("temperature span"));
        assertEquals(TemperatureSpan.kelvins(20), TemperatureSpan.of(Quantities.getQuantity(20, Units.KELVIN)));
        assertEquals(
                20,
                TemperatureSpan.kelvins(20).asQuantity(Units.CELSIUS).getValue().doubleValue());
        assertEquals(
                20,
                TemperatureSpan.of(TemperatureSpan.kelvins(20).asQuantity(Units.CELSIUS))
                        .inKelvins());
    }

    @Test
    void valuesGoOutInACoherentOrAChosenUnit() {
        final Quantity<javax.measure.quantity.Temperature> t =
                Temperature.kelvin(298.15).asQuantity(Units.CELSIUS);
        assertEquals(25, t.getValue().doubleValue(), 1e-13);
        assertEquals(Units.CELSIUS, t.getUnit());
        final Quantity<?> p = Pressure.bar(3.5).asQuantity();
        assertEquals(350000, p.getValue().doubleValue());
        assertTrue(p.getUnit().isCompatible(Units.PASCAL));
        assertEquals(
                3.5,
                Pressure.bar(3.5)
                                .asQuantity(MetricPrefix.HECTO(Units.PASCAL))
                                .getValue()
                                .doubleValue()
                        / 1000);
    }

    @Test
    void everyKindButMoneyGoesOutAndComesBack() {
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            final ScalarQuantity<?, ?> value = (ScalarQuantity<?, ?>) kind.ofSi(1234.5678);
            if (kind.dimension().money() == 0) {
                assertEquals(value, kind.of(value.asQuantity()));
            } else {
                assertTrue(assertThrows(UnsupportedOperationException.class, value::asQuantity)
                        .getMessage()
                        .contains("no unit of money"));
                final var number = Quantities.getQuantity(1, AbstractUnit.ONE);
                assertThrows(UnsupportedOperationException.class, () -> kind.of(number));
            }
        }
    }

    @Test
    void anglesAreRefusedSinceARevolutionIsNoRadian() {
        final var angular = Quantities.getQuantity(314, Units.RADIAN.divide(Units.SECOND));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> RotationalFrequency.of(angular))
                .getMessage()
                .contains("angles"));
        assertEquals(
                RotationalFrequency.revolutionsPerMinute(3000),
                RotationalFrequency.of(Quantities.getQuantity(50, Units.HERTZ)));
    }

    @Test
    void valuesThatDoNotExistAreRefusedHereToo() {
        final var cold = Quantities.getQuantity(-300, Units.CELSIUS);
        assertThrows(OutOfRangeException.class, () -> Temperature.of(cold));
    }
}
