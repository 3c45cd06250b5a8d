package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** The table of kinds on the package page is complete and says the coherent units that the kinds have. */
class PackagePageTest {
    @Test
    void theTableNamesEveryKindWithItsCoherentUnit() throws IOException {
        final String page = Files.readString(Path.of("src/main/java/lostwork/quantity/package-info.java"));
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            final String row = "<tr><td>{@link " + kind.type().getSimpleName() + "}</td><td>"
                    + kind.coherentUnit().symbol() + "</td>";
            assertTrue(page.contains(row), row);
        }
        assertEquals(AllKinds.kinds().size(), page.split("<tr><td>", -1).length - 1);
    }
}
