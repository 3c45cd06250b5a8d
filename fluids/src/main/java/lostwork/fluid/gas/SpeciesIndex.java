package lostwork.fluid.gas;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** The names of the species, and the species read so far; a file is read when its species is first asked for. */
final class SpeciesIndex {
    private static final String FOLDER = "species/";
    private static final SpeciesIndex OF_MODULE = new SpeciesIndex(DataFile.resource(FOLDER + "index.txt"));

    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final Map<String, Species> read = new ConcurrentHashMap<>();

    private SpeciesIndex(DataFile file) {
        for (DataFile.Line line : file.lines()) {
            final String[] words = line.text().split("\\s+", 3);
            if (words.length != 3) {
                throw line.failure("expected name, file and description");
            }
            if (entries.put(words[0], new Entry(words[1], words[2])) != null) {
                throw line.failure(words[0] + " is given twice");
            }
        }
    }

    static SpeciesIndex ofModule() {
        return OF_MODULE;
    }

    List<String> names() {
        return List.copyOf(entries.keySet());
    }

    Species find(String name) {
        final Entry entry = entries.get(name);
        if (entry == null) {
            throw new UnknownSpeciesException(name, near(name));
        }
        return read.computeIfAbsent(name, key -> {
            final DataFile file = DataFile.resource(FOLDER + entry.file);
            final SpeciesRecord species = SpeciesRecord.read(file);
            if (!species.name().equals(key)) {
                throw file.failure("the file names " + species.name() + ", the index " + key);
            }
            return new Species(species);
        });
    }

    private List<String> near(String wanted) {
        final List<Candidate> candidates = new ArrayList<>();
        entries.forEach((name, entry) -> {
            final int byName = distance(wanted, name);
            final int byDescription = distance(wanted, entry.description);
            // Up to two letters off, or half of a short name.
            if (byName <= Math.min(2, wanted.length() / 2) || byDescription <= 2) {
                candidates.add(new Candidate(name + " (" + entry.description + ")", Math.min(byName, byDescription)));
            }
        });
        return candidates.stream()
                .sorted(Comparator.comparingInt(Candidate::distance))
                .limit(5)
                .map(Candidate::words)
                .toList();
    }

    /** {@return the number of letters to add, drop or change, capitals and small letters being alike} */
    private static int distance(String left, String right) {
        final String a = left.toLowerCase(Locale.ROOT);
        final String b = right.toLowerCase(Locale.ROOT);
        int[] above = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            final int[] row = new int[b.length() + 1];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                final int change = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(change, 1 + Math.min(above[j], row[j - 1]));
            }
            above = row;
        }
        return above[b.length()];
    }

    private record Entry(String file, String description) {}

    private record Candidate(String words, int distance) {}
}
