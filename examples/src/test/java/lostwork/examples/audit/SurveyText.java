package lostwork.examples.audit;

import java.nio.charset.StandardCharsets;
import java.util.List;
import lostwork.quantity.Pressure;

/** Survey files written inside tests. */
final class SurveyText {
    static final String FILE = "works.csv";
    static final String HEADING = "tag,medium,composition,flow,supply temperature,lowest temperature,pressure,"
            + "hours per year,flow uncertainty,temperature uncertainty";
    static final String GOOD = "A1,dry air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K";

    private SurveyText() {}

    static Survey read(String... lines) {
        return read(String.join("\n", lines).getBytes(StandardCharsets.UTF_8));
    }

    static Survey read(byte[] bytes) {
        return SurveyReader.read(SourceText.of(FILE, bytes), Pressure.mbar(1000));
    }

    /** {@return the problems of a survey with a good line and another one, as text} */
    static List<String> problemsOf(String line) {
        return read(HEADING, GOOD, line).problems().stream()
                .map(Problem::toString)
                .toList();
    }
}
