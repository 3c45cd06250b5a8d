package lostwork.examples.audit;

import java.util.List;

/**
 * A survey as far as it could be read.
 *
 * @param file name of the file
 * @param lines the good lines, in the order of the file
 * @param problems what is wrong with the others, in the order of the file
 * @param remarks what a reader of the report should know about how the file was read
 */
record Survey(String file, List<SurveyLine> lines, List<Problem> problems, List<String> remarks) {
    Survey {
        lines = List.copyOf(lines);
        problems = List.copyOf(problems);
        remarks = List.copyOf(remarks);
    }
}
