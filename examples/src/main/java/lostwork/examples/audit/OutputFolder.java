package lostwork.examples.audit;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Map;

/** The folder that the results go to. */
final class OutputFolder {
    private final Path folder;

    /** What is in a file. */
    @FunctionalInterface
    interface Content {
        /**
         * Writes it.
         *
         * @param file the file to write or replace
         * @throws IOException if it cannot be written
         */
        void writeTo(Path file) throws IOException;

        /** {@return a text, written in UTF-8} */
        static Content of(String text) {
            return file -> Files.writeString(file, text, StandardCharsets.UTF_8);
        }
    }

    private OutputFolder(Path folder) {
        this.folder = folder;
    }

    /**
     * {@return the folder, made if it is not there, after a trial that it can be written to}
     *
     * @param folder its path
     * @throws RefusedInputException if it cannot be made or written to
     */
    static OutputFolder prepare(Path folder) {
        final Path absolute = folder.toAbsolutePath().normalize();
        try {
            Files.createDirectories(absolute);
            Files.delete(Files.createTempFile(absolute, "trial", ".txt"));
        } catch (FileAlreadyExistsException e) {
            throw refused(absolute, "there is a file of that name");
        } catch (IOException e) {
            throw refused(absolute, "the output folder cannot be written to");
        }
        return new OutputFolder(absolute);
    }

    private static RefusedInputException refused(Path folder, String what) {
        return new RefusedInputException(
                Problem.ofFile(folder.toString(), what, "a folder that you may write to; name another one with --out"));
    }

    /**
     * Writes files in UTF-8 with line feeds. Each one replaces an older file of its name as a whole.
     *
     * @param contents the content of each file by its name
     * @throws RefusedInputException if a file cannot be written, such as when the disk is full
     */
    void write(Map<String, Content> contents) {
        contents.forEach((name, content) -> {
            final Path target = folder.resolve(name);
            try {
                content.writeTo(target);
            } catch (IOException e) {
                throw new RefusedInputException(Problem.ofFile(
                        target.toString(), "the file cannot be written", "a folder with room that you may write to"));
            }
        });
    }

    /**
     * Removes files of an earlier run, so that they are not taken for results of this one.
     *
     * @param names the names of files that may be there
     * @throws RefusedInputException if one is there and cannot be removed
     */
    void remove(Collection<String> names) {
        for (String name : names) {
            final Path target = folder.resolve(name);
            try {
                Files.deleteIfExists(target);
            } catch (IOException e) {
                throw new RefusedInputException(Problem.ofFile(
                        target.toString(),
                        "this file of an earlier run cannot be removed",
                        "a folder that you may write to; name another one with --out"));
            }
        }
    }

    Path path() {
        return folder;
    }
}
