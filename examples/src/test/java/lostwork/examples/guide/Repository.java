package lostwork.examples.guide;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** The files of the repository, wherever below its top the tests were started. */
final class Repository {
    private Repository() {}

    static Path file(String name) {
        Path folder = Path.of("").toAbsolutePath();
        while (!Files.exists(folder.resolve("DEVELOPERS.md"))) {
            folder = folder.getParent();
            if (folder == null) {
                throw new IllegalStateException("start the tests inside the repository");
            }
        }
        return folder.resolve(name);
    }

    static List<String> lines(String name) {
        try {
            return Files.readAllLines(file(name));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
