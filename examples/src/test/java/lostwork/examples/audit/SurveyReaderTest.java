package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import lostwork.quantity.MassFlow;
import lostwork.quantity.NormalCondition;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

class SurveyReaderTest {
    @Test
    void readsALineWithUnitsInTheCells() {
        final Survey survey = SurveyText.read(SurveyText.HEADING, SurveyText.GOOD);
        assertEquals(List.of(), survey.problems());
        final SurveyLine line = survey.lines().get(0);
        assertEquals("A1", line.tag());
        assertEquals(2, line.line());
        assertEquals(new Medium.DryAir(), line.medium());
        assertEquals(new SurveyFlow.ByMass(MassFlow.tonnesPerHour(12)), line.flow());
        assertEquals(Temperature.celsius(220), line.supply());
        assertEquals(Temperature.celsius(60), line.lowest());
        assertEquals(Pressure.pascal(101300), line.pressure());
        assertEquals(8000, line.hoursPerYear().inHours(), 1e-9);
        assertEquals(5, line.flowUncertainty().inPercent(), 1e-12);
        assertEquals(2, line.temperatureUncertainty().si(), 0);
    }

    @Test
    void takesUnitsFromTheHeadingUnlessTheCellHasItsOwn() {
        final Survey survey = SurveyText.read(
                "Tag, Medium, Composition, Flow [kg/s], Supply Temperature [K], lowest_temperature [°F], pressure [kPa],"
                        + " hours per year [h], flow uncertainty [%], temperature uncertainty [K], Remark",
                "A1, water, , 3, 350, 140, 0.5 bar(g), 8760, 0, 0, \"a \"\"quoted\"\" remark, with a comma\"");
        assertEquals(List.of(), survey.problems());
        final SurveyLine line = survey.lines().get(0);
        assertEquals(350, line.supply().inKelvin(), 0);
        assertEquals(60, line.lowest().inCelsius(), 1e-9);
        assertEquals(1.5, line.pressure().inBar(), 1e-12);
    }

    @Test
    void readsEveryMedium() {
        final Survey survey = SurveyText.read(
                SurveyText.HEADING,
                "A,humid air,relative humidity 60 % at 25 °C,1 kg/s,100 °C,60 °C,1 bar,8000,5 %,2 K",
                "B,humid air,humidity ratio 12 g/kg,1 kg/s,100 °C,60 °C,1 bar,8000,5 %,2 K",
                "C,flue gas,natural gas with 18 % excess air,1 kg/s,300 °C,160 °C,1 bar,8000,5 %,2 K",
                "D,Flue Gas,natural gas with 3.5 % O2 dry,1000 Nm³/h wet,300 °C,160 °C,1 bar,8000,5 %,2 K",
                "E,gas mixture,N2 79 % + CO2 21 %,1000 Sm3/h,300 °C,160 °C,1 bar,8000,5 %,2 K",
                "F,water,,2 m³/h,80 °C,60 °C,3 bar,8000,5 %,2 K");
        assertEquals(List.of(), survey.problems());
        final Medium.FlueGas gas = (Medium.FlueGas) survey.lines().get(3).medium();
        final Medium.MeasuredOxygen oxygen = (Medium.MeasuredOxygen) gas.air();
        assertEquals(MoistureBasis.DRY, oxygen.basis());
        assertEquals(3.5, oxygen.share().inPercent(), 1e-12);
        final SurveyFlow.ByNormalVolume wet =
                (SurveyFlow.ByNormalVolume) survey.lines().get(3).flow();
        assertEquals(Optional.of(MoistureBasis.WET), wet.basis());
        assertEquals(1000, wet.flow().inNormalCubicMetresPerHour(NormalCondition.DIN_1343), 1e-9);
        final SurveyFlow.ByNormalVolume standard =
                (SurveyFlow.ByNormalVolume) survey.lines().get(4).flow();
        assertEquals(NormalCondition.ISO_13443, standard.condition());
    }

    @Test
    void namesAnUnknownMediumAndTheNearestName() {
        assertEquals(
                List.of("works.csv, line 3, column 4: medium: unknown medium \"dry aire\" (did you mean \"dry air\"?)."
                        + " Accepted: dry air, humid air, flue gas, gas mixture, water."),
                SurveyText.problemsOf("A2,dry aire,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void suggestsNothingForAWordThatIsFarFromAll() {
        assertEquals(
                List.of("works.csv, line 3, column 4: medium: unknown medium \"steam\"."
                        + " Accepted: dry air, humid air, flue gas, gas mixture, water."),
                SurveyText.problemsOf("A2,steam,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void namesAnUnknownFuelAndAnUnknownGas() {
        assertEquals(
                List.of("works.csv, line 3, column 13: composition: unknown fuel \"naturalgas\""
                        + " (did you mean \"natural gas\"?). Accepted: "
                        + String.join(", ", SurveyFuel.vocabulary().words()) + "."),
                SurveyText.problemsOf(
                        "A2,flue gas,naturalgas with 18 % excess air,12 t/h,220 °C,60 °C,1 bar,8000,5 %,2 K"));
        assertEquals(
                List.of("works.csv, line 3, column 16: composition: unknown gas \"Xy\". Accepted: "
                        + String.join(", ", SurveyGas.vocabulary().words()) + "."),
                SurveyText.problemsOf("A2,gas mixture,Xy 50 % + N2 50 %,12 t/h,220 °C,60 °C,1 bar,8000,5 %,2 K"));
    }

    @Test
    void refusesANegativeAndAZeroFlow() {
        assertEquals(
                List.of("works.csv, line 3, column 13: flow: the flow is negative: -12 t/h. Accepted: a flow above 0."),
                SurveyText.problemsOf("A2,dry air,,-12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
        assertEquals(
                List.of("works.csv, line 3, column 13: flow: the flow is zero: 0 t/h. Accepted: a flow above 0."),
                SurveyText.problemsOf("A2,dry air,,0 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void refusesAnOutletHotterThanTheSupply() {
        assertEquals(
                List.of("works.csv, line 3, column 27: lowest temperature: the lowest temperature 230 °C is above the"
                        + " supply temperature 220 °C. Accepted: a temperature from absolute zero up to the supply"
                        + " temperature."),
                SurveyText.problemsOf("A2,dry air,,12 t/h,220 °C,230 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void refusesALineWithTooFewOrTooManyCells() {
        assertEquals(
                List.of("works.csv, line 3, column 17: the line has 4 cells, but the heading has 10 columns."
                        + " Accepted: 10 cells separated by \",\", decimal points, and quotes around a cell with"
                        + " commas."),
                SurveyText.problemsOf("A2,dry air,,1t/h"));
        assertEquals(
                List.of("works.csv, line 3, column 54: the line has 11 cells, but the heading has 10 columns"
                        + " (a decimal comma, or a comma in a cell without quotes?)."
                        + " Accepted: 10 cells separated by \",\", decimal points, and quotes around a cell with"
                        + " commas."),
                SurveyText.problemsOf("A2,dry air,,12,5 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void refusesADoubledTag() {
        assertEquals(
                List.of("works.csv, line 3, column 1: tag: the tag \"a1\" is already used in line 2."
                        + " Accepted: a tag that no other line has."),
                SurveyText.problemsOf("a1,dry air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }

    @Test
    void refusesUnreadableUnits() {
        final List<String> flow = SurveyText.problemsOf("A2,dry air,,12 furlong/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K");
        assertEquals(1, flow.size());
        assertTrue(
                flow.get(0)
                        .startsWith("works.csv, line 3, column 13: flow: the unit \"furlong/h\" is none of a mass flow."
                                + " Accepted: kg/s, kg/h, t/h, "),
                flow.get(0));
        assertTrue(flow.get(0).contains("Nm³/h wet"), flow.get(0));
        final List<String> temperature = SurveyText.problemsOf("A2,dry air,,12 t/h,220 C,60,1013 mbar,8000,5 %,2 K");
        assertEquals(
                List.of(
                        "works.csv, line 3, column 20: supply temperature: the unit \"C\" is none of a temperature."
                                + " Accepted: °C, K, °F, °R.",
                        "works.csv, line 3, column 26: lowest temperature: \"60\" has no unit, neither here nor in the"
                                + " heading. Accepted: °C, K, °F, °R."),
                temperature);
    }

    @Test
    void refusesMoreHoursThanAYearHas() {
        assertEquals(
                List.of("works.csv, line 3, column 43: hours per year: 8761 hours a year are more than a year has."
                        + " Accepted: above 0 and up to 8760 h."),
                SurveyText.problemsOf("A2,dry air,,12 t/h,220 °C,60 °C,1013 mbar,8761,5 %,2 K"));
    }

    @Test
    void refusesAHumidityOverOneHundredPercent() {
        assertEquals(
                List.of("works.csv, line 3, column 14: composition: a relative humidity of 104.5 % does not exist."
                        + " Accepted: 0 % to 100 %."),
                SurveyText.problemsOf(
                        "A2,humid air,relative humidity 104.5 % at 25 °C,1 kg/s,100 °C,60 °C,1 bar,8000,5 %,2 K"));
    }

    @Test
    void refusesOxygenWithoutWetOrDry() {
        assertEquals(
                List.of("works.csv, line 3, column 13: composition: it is not stated whether the 3.5 % O2 were measured"
                        + " wet or dry. Accepted: \"3.5 % O2 dry\" (analyser behind a gas cooler) or \"3.5 % O2 wet\""
                        + " (probe in the hot gas)."),
                SurveyText.problemsOf("A2,flue gas,natural gas with 3.5 % O2,12 t/h,220 °C,160 °C,1 bar,8000,5 %,2 K"));
    }

    @Test
    void refusesAMoistGasVolumeWithoutWetOrDry() {
        final List<String> problems = SurveyText.problemsOf(
                "A2,flue gas,natural gas with 18 % excess air,900 Nm³/h,220 °C,160 °C,1 bar,8000,5 %,2 K");
        assertEquals(
                List.of("works.csv, line 3, column 46: flow: it is not stated whether the normal volume flow 900 Nm³/h"
                        + " counts the gas wet or dry. Accepted: \"900 Nm³/h wet\" or \"900 Nm³/h dry\"."),
                problems);
    }

    @Test
    void refusesACompositionThatDoesNotSumUp() {
        assertEquals(
                List.of("works.csv, line 3, column 16: composition: the mole percents sum to 90 %."
                        + " Accepted: a sum of 100 % within 0.2 %."),
                SurveyText.problemsOf("A2,gas mixture,CO2 40 % + N2 50 %,12 t/h,220 °C,60 °C,1 bar,8000,5 %,2 K"));
    }

    @Test
    void namesEveryProblemOfALineAndKeepsTheGoodOnes() {
        final Survey survey = SurveyText.read(
                SurveyText.HEADING,
                SurveyText.GOOD,
                "A2,dry air,,-12 t/h,220 °C,60 °C,0 bar,9000,-5 %,2 K",
                "A3,dry air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K");
        assertEquals(2, survey.lines().size());
        assertEquals(4, survey.problems().size());
        assertTrue(survey.problems().stream().allMatch(problem -> problem.line() == 3));
    }

    @Test
    void refusesAMissingADoubledAndAnUnknownColumnAtOnce() {
        final RefusedInputException refused = assertThrows(
                RefusedInputException.class,
                () -> SurveyText.read(
                        "tag,medium,composition,flow,flow,supply temperatur,pressure,hours per year,flow uncertainty,"
                                + "temperature uncertainty",
                        SurveyText.GOOD));
        assertEquals(
                List.of(
                        "works.csv, line 1, column 29: the column \"flow\" is there twice. Accepted: each column once.",
                        "works.csv, line 1, column 34: unknown column \"supply temperatur\" (did you mean \"supply"
                                + " temperature\"?). Accepted: "
                                + String.join(", ", SurveyColumn.vocabulary().words()) + "."),
                refused.getMessage().lines().limit(2).toList());
        assertTrue(
                refused.getMessage()
                        .contains(
                                "works.csv, line 1, column 116: the columns \"supply temperature\", \"lowest temperature\" are"
                                        + " missing. Accepted: a heading line with the columns tag, medium, "),
                refused.getMessage());
    }

    @Test
    void refusesAnEmptyFileAndAFileWithoutStreams() {
        assertEquals(
                "works.csv: the file is empty. Accepted: a heading line and one line for each stream.",
                assertThrows(RefusedInputException.class, () -> SurveyText.read(new byte[0]))
                        .getMessage());
        assertEquals(
                "works.csv: the file is empty. Accepted: a heading line and one line for each stream.",
                assertThrows(RefusedInputException.class, () -> SurveyText.read("", "  ", "# only a comment"))
                        .getMessage());
        assertEquals(
                "works.csv: there is a heading line but no stream. Accepted: one line for each stream below it.",
                assertThrows(RefusedInputException.class, () -> SurveyText.read(SurveyText.HEADING))
                        .getMessage());
    }

    @Test
    void refusesOnlyTheLinesThatAreNotUtf8() {
        final byte[] latin = (SurveyText.HEADING
                        + "\nA1,dry air,,12 t/h,500 K,400 K,1013 mbar,8000,5 %,2 K"
                        + "\nA2,dry air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K")
                .getBytes(StandardCharsets.ISO_8859_1);
        final Survey survey = SurveyText.read(latin);
        assertEquals(1, survey.lines().size());
        assertEquals(
                "works.csv, line 3, column 24: byte 0xB0 is not UTF-8 (in Latin-1 it would be \"°\")."
                        + " Accepted: a text file in UTF-8; save it again with that encoding.",
                survey.problems().get(0).toString());
    }

    @Test
    void refusesUtf16WithAndWithoutItsMark() {
        for (byte[] bytes : List.of(
                SurveyText.HEADING.getBytes(StandardCharsets.UTF_16),
                SurveyText.HEADING.getBytes(StandardCharsets.UTF_16LE))) {
            assertEquals(
                    "works.csv: the file is UTF-16 or not text: it holds zero bytes or a UTF-16 mark."
                            + " Accepted: a text file in UTF-8; save it again with that encoding.",
                    assertThrows(RefusedInputException.class, () -> SurveyText.read(bytes))
                            .getMessage());
        }
    }

    @Test
    void acceptsAByteOrderMarkAndEveryLineEnd() {
        for (String end : List.of("\n", "\r\n", "\r")) {
            final String text = "\uFEFF" + SurveyText.HEADING + end + SurveyText.GOOD + end;
            assertEquals(
                    1,
                    SurveyText.read(text.getBytes(StandardCharsets.UTF_8))
                            .lines()
                            .size());
        }
    }

    @Test
    void refusesQuotesThatDoNotMatch() {
        assertEquals(
                List.of("works.csv, line 3, column 4: the quoted cell is not closed on its line."
                        + " Accepted: a cell in quotes from end to end, with quotes inside doubled."),
                SurveyText.problemsOf("A2,\"dry air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
        assertEquals(
                List.of("works.csv, line 3, column 13: text follows the closing quote of a cell."
                        + " Accepted: a cell in quotes from end to end, with quotes inside doubled."),
                SurveyText.problemsOf("A2,\"dry air\"x,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
        assertEquals(
                List.of("works.csv, line 3, column 7: a quote stands inside a cell that does not start with one."
                        + " Accepted: a cell in quotes from end to end, with quotes inside doubled."),
                SurveyText.problemsOf("A2,dry\" air,,12 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K"));
    }
}
