package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InvalidObjectException;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import java.nio.ByteBuffer;
import org.junit.jupiter.api.Test;

/** Values go through a stream unchanged, and a stream that was tampered with gives no value that cannot exist. */
class SerializationTest {
    private static byte[] write(Object value) throws IOException {
        final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(value);
        }
        return bytes.toByteArray();
    }

    private static Object read(byte[] bytes) throws IOException, ClassNotFoundException {
        try (ObjectInputStream in = new ObjectInputStream(new ByteArrayInputStream(bytes))) {
            return in.readObject();
        }
    }

    /** {@return the stream of a value with the one number in it replaced} */
    private static byte[] tampered(ScalarQuantity<?, ?> value, double si) throws IOException {
        final byte[] bytes = write(value);
        final ByteBuffer buffer = ByteBuffer.wrap(bytes);
        int hits = 0;
        for (int i = 0; i + Double.BYTES <= bytes.length; i++) {
            if (buffer.getDouble(i) == value.si()) {
                buffer.putDouble(i, si);
                hits++;
            }
        }
        assertEquals(1, hits);
        return bytes;
    }

    @Test
    void everyKindComesBackEqual() throws Exception {
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            final Object value = kind.ofSi(1234.5678);
            final Object back = read(write(value));
            assertEquals(value, back);
            assertEquals(value.getClass(), back.getClass());
        }
    }

    @Test
    void tamperedStreamsAreRefused() throws Exception {
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            for (double si : new double[] {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY}) {
                final byte[] bytes = tampered(kind.ofSi(1234.5678), si);
                final var e = assertThrows(InvalidObjectException.class, () -> read(bytes));
                assertTrue(e.getMessage().startsWith(kind.name() + " = "), e.getMessage());
                assertEquals(OutOfRangeException.class, e.getCause().getClass());
            }
        }
        final byte[] cold = tampered(Temperature.kelvin(300), -1);
        assertThrows(InvalidObjectException.class, () -> read(cold));
        final byte[] zero = tampered(Temperature.kelvin(300), 0);
        assertThrows(InvalidObjectException.class, () -> read(zero));
        final byte[] belowVacuum = tampered(Pressure.bar(1), -1e-300);
        assertThrows(InvalidObjectException.class, () -> read(belowVacuum));
        assertEquals(Temperature.kelvin(301), read(tampered(Temperature.kelvin(300), 301)));
    }

    @Test
    void aNegativeZeroInAStreamIsZero() throws Exception {
        final Object back = read(tampered(Power.watts(1234.5678), -0.0));
        assertEquals(Power.watts(0), back);
        assertEquals(Power.watts(0).hashCode(), back.hashCode());
    }
}
