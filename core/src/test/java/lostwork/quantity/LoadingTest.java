package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.lang.reflect.InvocationTargetException;
import java.net.URL;
import java.net.URLClassLoader;
import javax.measure.Quantity;
import org.junit.jupiter.api.Test;

/** Indriya is loaded only when a JSR-385 quantity is asked for. */
class LoadingTest {
    @Test
    void readingArithmeticAndPrintingDoWithoutIndriya() throws Exception {
        final URL[] places = {
            ScalarQuantity.class.getProtectionDomain().getCodeSource().getLocation(),
            Quantity.class.getProtectionDomain().getCodeSource().getLocation()
        };
        // No parent: the platform loader would find the modules that this test runs in.
        try (URLClassLoader loader = new URLClassLoader(places, null)) {
            final Class<?> type = loader.loadClass("lostwork.quantity.Energy");
            assertEquals(loader, type.getClassLoader());
            final Object energy = type.getMethod("parse", String.class).invoke(null, "3 kWh");
            final Object twice = type.getMethod("times", double.class).invoke(energy, 2.0);
            assertEquals("21600 kJ", twice.toString());
            final var missing = assertThrows(
                    InvocationTargetException.class,
                    () -> type.getMethod("asQuantity").invoke(twice));
            assertInstanceOf(NoClassDefFoundError.class, missing.getCause());
        }
    }
}
