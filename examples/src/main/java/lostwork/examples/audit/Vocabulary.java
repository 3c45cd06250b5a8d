package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * A closed list of words that a file may use, and what each stands for. Case and repeated blanks play no part.
 *
 * @param <T> what the words stand for
 */
final class Vocabulary<T> {
    private final String noun;
    private final Map<String, T> meanings = new LinkedHashMap<>();
    private final List<String> words = new ArrayList<>();

    /**
     * Creates an empty list.
     *
     * @param noun what the words name, such as {@code "medium"}
     */
    Vocabulary(String noun) {
        this.noun = noun;
    }

    Vocabulary<T> with(String word, T meaning) {
        words.add(word);
        meanings.put(plain(word), meaning);
        return this;
    }

    List<String> words() {
        return List.copyOf(words);
    }

    /**
     * {@return what a word stands for}
     *
     * @param word the word as written
     * @throws CellRefusedException if the word is not on the list; the message names the nearest one
     */
    T meaningOf(String word) {
        final T meaning = meanings.get(plain(word));
        if (meaning == null) {
            throw new CellRefusedException(
                    "unknown " + noun + " \"" + word + "\"" + suggestion(word), String.join(", ", words));
        }
        return meaning;
    }

    boolean has(String word) {
        return meanings.containsKey(plain(word));
    }

    private String suggestion(String word) {
        final String sought = plain(word);
        final int near = Math.max(1, sought.length() / 3);
        String best = "";
        int least = near + 1;
        for (String candidate : words) {
            final int distance = editDistance(sought, plain(candidate));
            if (distance < least) {
                least = distance;
                best = candidate;
            }
        }
        return best.isEmpty() ? "" : " (did you mean \"" + best + "\"?)";
    }

    static String plain(String word) {
        return word.strip().replace('_', ' ').replaceAll("\\s+", " ").toLowerCase(Locale.ROOT);
    }

    /** Counts the insertions, deletions and replacements that turn one word into another (Levenshtein 1966). */
    private static int editDistance(String a, String b) {
        int[] previous = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            previous[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            final int[] current = new int[b.length() + 1];
            current[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                final int replaced = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                current[j] = Math.min(replaced, 1 + Math.min(previous[j], current[j - 1]));
            }
            previous = current;
        }
        return previous[b.length()];
    }
}
