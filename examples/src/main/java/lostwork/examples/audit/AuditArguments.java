package lostwork.examples.audit;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

/**
 * What the command line asks for.
 *
 * @param survey the survey file; empty for the bundled one
 * @param site the site file; empty for the bundled one
 * @param output the folder for the results
 * @param help whether only the help is asked for
 */
record AuditArguments(Optional<Path> survey, Optional<Path> site, Path output, boolean help) {
    static final Path DEFAULT_OUTPUT = Path.of("out", "waste-heat-audit");

    private enum Option {
        SURVEY,
        SITE,
        OUT
    }

    private static final Vocabulary<Option> OPTIONS = new Vocabulary<Option>("argument")
            .with("--survey", Option.SURVEY)
            .with("--site", Option.SITE)
            .with("--out", Option.OUT);

    /**
     * {@return the arguments}
     *
     * @param arguments the words of the command line
     * @throws RefusedInputException if they cannot be understood
     */
    static AuditArguments of(String... arguments) {
        final Map<Option, Path> paths = new EnumMap<>(Option.class);
        for (int i = 0; i < arguments.length; i += 2) {
            if (arguments[i].equals("--help") || arguments[i].equals("-h")) {
                return new AuditArguments(Optional.empty(), Optional.empty(), DEFAULT_OUTPUT, true);
            }
            final Option option = option(arguments[i]);
            if (i + 1 == arguments.length || arguments[i + 1].startsWith("--")) {
                throw usage(arguments[i] + " must be followed by a path");
            }
            if (paths.putIfAbsent(option, path(arguments[i], arguments[i + 1])) != null) {
                throw usage(arguments[i] + " is given twice");
            }
        }
        return new AuditArguments(
                Optional.ofNullable(paths.get(Option.SURVEY)),
                Optional.ofNullable(paths.get(Option.SITE)),
                paths.getOrDefault(Option.OUT, DEFAULT_OUTPUT),
                false);
    }

    private static Option option(String word) {
        try {
            return OPTIONS.meaningOf(word);
        } catch (CellRefusedException e) {
            throw usage(e.what());
        }
    }

    private static Path path(String option, String text) {
        try {
            return Path.of(text);
        } catch (InvalidPathException e) {
            throw usage(option + ": \"" + text + "\" is no path");
        }
    }

    private static RefusedInputException usage(String what) {
        return new RefusedInputException(
                what + ". Accepted: " + String.join(", ", OPTIONS.words()) + ", each followed by a path, and --help.");
    }
}
