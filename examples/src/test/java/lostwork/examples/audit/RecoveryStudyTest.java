package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.examples.recovery.RecoveryDesign;
import lostwork.quantity.EmissionFactor;
import lostwork.quantity.EnergyPrice;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

class RecoveryStudyTest {
    private static final Site SITE = new Site(
            "test works",
            Temperature.celsius(12),
            Pressure.mbar(1013),
            Ratio.percent(70),
            "EUR",
            EnergyPrice.perMegawattHour(96),
            EnergyPrice.perMegawattHour(38),
            EmissionFactor.kilogramsPerMegawattHour(310));

    private static AuditResult audit(String... lines) {
        final Survey survey = SurveyText.read(lines);
        final StreamAnalysis analysis = new StreamAnalysis(SITE);
        return new AuditResult(
                SITE, survey, survey.lines().stream().map(analysis::of).toList(), List.of());
    }

    @Test
    void whatCannotBeSolvedBecomesOneParagraph() {
        final RecoveryDesign impossible = RecoveryDesign.smallWasteHeatPlant()
                .withLowestVapourFraction(Ratio.percent(120), "impossible, for this test");
        final RecoveryOutcome outcome = new RecoveryStudy(
                        audit(SurveyText.HEADING, "hot,dry air,,60 t/h,600 °C,160 °C,1013 mbar,8000,5 %,2 K"),
                        impossible)
                .run(tried -> {});
        assertTrue(outcome.proposal().isEmpty());
        assertEquals(1, outcome.passedOver().size());
        final String sentence = outcome.passedOver().get(0);
        assertTrue(sentence.startsWith("hot: the plant cannot be solved: "), sentence);
        assertTrue(sentence.contains("vapour fraction"), sentence);
        assertFalse(sentence.contains("\n"), sentence);
    }

    @Test
    void takesTheGasThatRanksFirst() {
        final RecoveryOutcome outcome = new RecoveryStudy(
                        audit(
                                SurveyText.HEADING,
                                "less,dry air,,20 t/h,500 °C,160 °C,1013 mbar,8000,5 %,2 K",
                                "more,dry air,,40 t/h,500 °C,160 °C,1013 mbar,8000,5 %,2 K",
                                "water,water,,900 t/h,95 °C,20 °C,2 bar,8000,5 %,2 K"),
                        RecoveryDesign.smallWasteHeatPlant())
                .run(tried -> {});
        assertEquals("more", outcome.proposal().orElseThrow().figures().stream().tag());
        assertEquals(List.of(), outcome.passedOver());
    }
}
