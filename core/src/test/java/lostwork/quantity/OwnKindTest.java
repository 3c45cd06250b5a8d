package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import java.util.List;
import org.junit.jupiter.api.Test;
import tech.units.indriya.quantity.Quantities;

/** A user defines kinds of quantity that the library does not have. */
class OwnKindTest {
    /** Power per volume, such as that of a burner's combustion chamber. */
    static final class PowerDensity extends LinearQuantity<PowerDensity> {
        private static final long serialVersionUID = 1L;

        static final Unit<PowerDensity> MEGAWATT_PER_CUBIC_METRE = Unit.of("MW/m³", 1e6);
        static final Unit<PowerDensity> WATT_PER_CUBIC_METRE = Unit.of("W/m³", 1);

        static final QuantityKind<PowerDensity, PowerDensity> KIND = QuantityKind.linear(
                "power density",
                PowerDensity.class,
                Power.KIND.dimension().dividedBy(Volume.KIND.dimension()),
                PowerDensity::new,
                1e6,
                List.of(MEGAWATT_PER_CUBIC_METRE, WATT_PER_CUBIC_METRE));

        private PowerDensity(double si) {
            super(si, KIND);
        }

        static PowerDensity of(Power power, Volume volume) {
            return new PowerDensity(power.si() / volume.si());
        }

        @Override
        public QuantityKind<PowerDensity, PowerDensity> kind() {
            return KIND;
        }

        @Override
        protected PowerDensity with(double si) {
            return new PowerDensity(si);
        }
    }

    /** Light that falls on an area; its dimension has luminous intensity in it. */
    static final class Illuminance extends LinearQuantity<Illuminance> {
        private static final long serialVersionUID = 1L;

        static final QuantityKind<Illuminance, Illuminance> KIND = QuantityKind.linear(
                "illuminance",
                Illuminance.class,
                Dimension.LUMINOUS_INTENSITY.dividedBy(Dimension.LENGTH.pow(2)),
                Illuminance::new,
                500,
                List.of(Unit.of("lx", 1)));

        private Illuminance(double si) {
            super(si, KIND);
        }

        @Override
        public QuantityKind<Illuminance, Illuminance> kind() {
            return KIND;
        }

        @Override
        protected Illuminance with(double si) {
            return new Illuminance(si);
        }
    }

    @Test
    void anOwnKindDoesAllThatABuiltInOneDoes() throws Exception {
        final PowerDensity q = PowerDensity.of(Power.megawatts(3), Volume.cubicMetres(2));
        assertEquals("1.5 MW/m³", q.toString());
        assertEquals(q, PowerDensity.KIND.parse("1500000 W m^-3"));
        assertEquals(q, PowerDensity.KIND.parse(q.toExactString()));
        assertEquals("3 MW/m³", q.plus(q).toString());
        assertEquals(Ratio.fraction(1), q.over(q));
        assertEquals(q, PowerDensity.KIND.of(q.asQuantity()));
        assertThrows(OutOfRangeException.class, () -> q.times(Double.NaN));
        final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(q);
        }
        try (ObjectInputStream in = new ObjectInputStream(new ByteArrayInputStream(bytes.toByteArray()))) {
            assertEquals(q, in.readObject());
        }
    }

    @Test
    void lightHasAKindToo() {
        final var lux = tech.units.indriya.unit.Units.LUX;
        assertEquals(Illuminance.KIND.parse("300 lx"), Illuminance.KIND.of(Quantities.getQuantity(300, lux)));
    }

    @Test
    void badDefinitionsAreRefused() {
        final var unit = Unit.<Illuminance>of("lx", 1);
        assertThrows(IllegalArgumentException.class, () -> kind(List.of(Unit.of("klx", 1000))));
        assertThrows(IllegalArgumentException.class, () -> kind(List.of(unit, Unit.of("lux", 2, "lx"))));
        assertThrows(IllegalArgumentException.class, () -> kind(List.of()));
        assertThrows(IllegalArgumentException.class, () -> Unit.of("x", 0));
        assertThrows(IllegalArgumentException.class, () -> Unit.of("x", Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> Unit.of(" ", 1));
        assertThrows(IllegalArgumentException.class, () -> Unit.withOffset("x", 1, 1, Double.NaN));
    }

    private static QuantityKind<Illuminance, Illuminance> kind(List<Unit<Illuminance>> units) {
        return QuantityKind.linear(
                "illuminance", Illuminance.class, Illuminance.KIND.dimension(), Illuminance::new, 1, units);
    }
}
