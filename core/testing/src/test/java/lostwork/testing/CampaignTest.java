package lostwork.testing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CampaignTest {
    @Test
    void multipliesTheUsualNumber() {
        assertEquals(500, Campaign.cases(500, "1"));
        assertEquals(10_000, Campaign.cases(500, " 20 "));
        assertEquals(Integer.MAX_VALUE, Campaign.cases(1_000_000, "1000000"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-3", "many", "", "1.5", "1000001"})
    void refusesWhatIsNoFactor(String factor) {
        final String message = assertThrows(IllegalArgumentException.class, () -> Campaign.cases(1, factor))
                .getMessage();
        assertTrue(message.contains(Campaign.FACTOR) && message.contains('"' + factor + '"'), message);
    }

    @Test
    void refusesATestWithoutCases() {
        assertThrows(IllegalArgumentException.class, () -> Campaign.cases(0, "1"));
    }
}
