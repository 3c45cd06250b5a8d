package lostwork.examples.guide;

import java.util.ArrayList;
import java.util.List;

/** One part of a page in Markdown: what stands under a heading of the second level, down to the next one. */
record Page(String heading, List<String> lines) {
    private static final String INDENT = "    ";

    static Page part(String file, String heading) {
        final List<String> lines = Repository.lines(file);
        final int start = lines.indexOf("## " + heading);
        if (start < 0) {
            throw new AssertionError(file + " has no heading \"## " + heading + "\"");
        }
        int end = start + 1;
        while (end < lines.size() && !lines.get(end).startsWith("## ")) {
            end++;
        }
        return new Page(heading, lines.subList(start + 1, end));
    }

    /** {@return the fenced blocks of a language, empty for none stated} */
    List<List<String>> fenced(String language) {
        final List<List<String>> blocks = new ArrayList<>();
        List<String> open = null;
        boolean wanted = false;
        for (String line : lines) {
            if (!line.startsWith("```")) {
                if (open != null) {
                    open.add(line);
                }
            } else if (open == null) {
                open = new ArrayList<>();
                wanted = line.equals("```" + language);
            } else {
                if (wanted) {
                    blocks.add(open);
                }
                open = null;
            }
        }
        return blocks;
    }

    /** {@return the lines that are set off by an indent, without it} */
    List<String> indented() {
        return lines.stream()
                .filter(line -> line.startsWith(INDENT))
                .map(line -> line.substring(INDENT.length()))
                .toList();
    }
}
