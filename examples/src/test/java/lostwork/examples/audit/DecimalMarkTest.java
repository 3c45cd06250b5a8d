package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Semicolons, commas and points: what is read, and what cannot be told apart. */
class DecimalMarkTest {
    private static final String HEADING = SurveyText.HEADING.replace(',', ';');

    @Test
    void readsSemicolonsWithDecimalCommasAndSaysSo() {
        final Survey survey = SurveyText.read(
                HEADING,
                "A1;dry air;;12,5 t/h;220,5 °C;60 °C;1013 mbar;8000;5 %;0,125 K",
                "A2;gas mixture;N2 79,5 % + CO2 20,5 %;1,250 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K");
        assertEquals(List.of(), survey.problems());
        assertEquals(220.5, survey.lines().get(0).supply().inCelsius(), 1e-9);
        assertEquals(
                1.25 / 3.6,
                ((SurveyFlow.ByMass) survey.lines().get(1).flow()).flow().inKilogramsPerSecond(),
                1e-12,
                "other numbers of the file show that its comma is decimal");
        assertEquals(List.of("works.csv is read with semicolons between cells and a decimal comma."), survey.remarks());
    }

    @Test
    void readsSemicolonsWithDecimalPoints() {
        final Survey survey = SurveyText.read(HEADING, "A1;dry air;;12.5 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K");
        assertEquals(List.of(), survey.problems());
        assertEquals(List.of("works.csv is read with semicolons between cells and a decimal point."), survey.remarks());
    }

    @Test
    void refusesAFileWhoseOnlyMarksMayBeThousandsSeparators() {
        final Survey survey = SurveyText.read(
                HEADING,
                "A1;dry air;;12,500 kg/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K",
                "A2;dry air;;12 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K");
        assertEquals(1, survey.lines().size());
        assertEquals(
                List.of("works.csv, line 2, column 13: flow: \"12,500\" may be a decimal number or have a thousands"
                        + " separator: no number in the file tells which. Accepted: numbers without thousands"
                        + " separators; write \"12,5000\" or leave the mark out."),
                survey.problems().stream().map(Problem::toString).toList());
    }

    @Test
    void refusesNumbersWithMarksWhereBothMarksOccur() {
        final Survey survey = SurveyText.read(
                HEADING,
                "A1;dry air;;12,5 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K",
                "A2;dry air;;1.250 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K",
                "A3;dry air;;12 t/h;220 °C;60 °C;1013 mbar;8000;5 %;2 K");
        assertEquals(1, survey.lines().size());
        assertEquals(2, survey.problems().size());
        assertEquals(
                "works.csv, line 3, column 13: flow: \"1.250\" cannot be read, since the file uses both points and"
                        + " commas in its numbers: which one is the decimal mark cannot be told. Accepted: one decimal"
                        + " mark in the whole file, and no thousands separators.",
                survey.problems().get(1).toString());
    }

    @Test
    void refusesAHeadingWithCommasAndSemicolons() {
        final RefusedInputException refused = assertThrows(
                RefusedInputException.class,
                () -> SurveyText.read(SurveyText.HEADING.replace(",flow,", ";flow,"), SurveyText.GOOD));
        assertEquals(
                "works.csv, line 1, column 23: the heading line holds commas and semicolons: which of them separates"
                        + " cells cannot be told. Accepted: a heading line with one of them only.",
                refused.getMessage());
    }

    @Test
    void refusesAHeadingWithNeither() {
        final String message = assertThrows(
                        RefusedInputException.class, () -> SurveyText.read("tag\tmedium\tflow", "A1\tdry air\t1 t/h"))
                .getMessage();
        assertTrue(
                message.startsWith("works.csv, line 1, column 1: the heading line \"tag\tmedium\tflow\" has no commas"
                        + " and no semicolons."),
                message);
    }

    @Test
    void refusesAQuotedDecimalCommaBetweenCommas() {
        assertEquals(
                List.of(
                        "works.csv, line 3, column 14: flow: \"12,5\" is not a number. Accepted: a number such as 1250.5"
                                + " with a decimal point, without thousands separators."),
                SurveyText.problemsOf("A2,dry air,,\"12,5 t/h\",220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void refusesThousandsSeparators() {
        assertEquals(
                List.of("works.csv, line 3, column 13: flow: \"1.250.000\" is not a number. Accepted: a number such as"
                        + " 1250.5 with a decimal point, without thousands separators."),
                SurveyText.problemsOf("A2,dry air,,1.250.000 kg/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void readsExponentsAndTheMinusSignOfTypesetters() {
        final NumberStyle style = NumberStyle.decimalPoint();
        assertEquals(1.25e4, style.leading("1.25e4 kg/h").value(), 0);
        assertEquals("kg/h", style.leading("1.25e4 kg/h").rest());
        assertEquals(-5.5, style.leading("\u22125.5 °C").value(), 0);
        assertThrows(CellRefusedException.class, () -> style.leading("1e999 K"));
        assertThrows(CellRefusedException.class, () -> style.leading("NaN K"));
        assertThrows(CellRefusedException.class, () -> style.leading("5. K"));
    }
}
