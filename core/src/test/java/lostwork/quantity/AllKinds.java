package lostwork.quantity;

import java.io.IOException;
import java.lang.reflect.Modifier;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Finds every value class of the package by looking at the compiled classes, so that none escapes the laws. */
final class AllKinds {
    private AllKinds() {}

    /** {@return the value classes, in the order of their names} */
    static List<Class<?>> classes() {
        try {
            final Path root = Path.of(ScalarQuantity.class
                    .getProtectionDomain()
                    .getCodeSource()
                    .getLocation()
                    .toURI());
            try (Stream<Path> files = Files.list(root.resolve("lostwork/quantity"))) {
                return files.map(file -> file.getFileName().toString())
                        .filter(name -> name.endsWith(".class") && !name.equals("package-info.class"))
                        .sorted()
                        .<Class<?>>map(name -> load(name.substring(0, name.length() - ".class".length())))
                        .filter(type -> ScalarQuantity.class.isAssignableFrom(type)
                                && !Modifier.isAbstract(type.getModifiers()))
                        .toList();
            }
        } catch (IOException | URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }

    /** {@return the kinds of the value classes} */
    static List<QuantityKind<?, ?>> kinds() {
        return classes().stream().<QuantityKind<?, ?>>map(AllKinds::kindOf).toList();
    }

    /** {@return the kind of a value class} */
    static QuantityKind<?, ?> kindOf(Class<?> type) {
        try {
            return (QuantityKind<?, ?>) type.getField("KIND").get(null);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(type + " has no public KIND", e);
        }
    }

    private static Class<?> load(String name) {
        try {
            return Class.forName("lostwork.quantity." + name);
        } catch (ClassNotFoundException e) {
            throw new IllegalStateException(e);
        }
    }
}
