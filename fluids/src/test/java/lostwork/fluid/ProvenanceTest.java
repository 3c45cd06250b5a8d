package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

class ProvenanceTest {
    @Test
    void printsAsAnAlignedBlock() {
        final Provenance provenance = Provenance.of("equation of state")
                .withSource("A. Author, A paper, equation 3", "from memory, confirmed by the check values")
                .withRange("any")
                .withDatum("h = 0 at 0 °C")
                .withReservation("not for mixtures");
        assertEquals("""
                formulation  equation of state
                source       A. Author, A paper, equation 3 [from memory, confirmed by the check values]
                range        any
                uncertainty  not stated
                datum        h = 0 at 0 °C
                reservation  not for mixtures""", provenance.toString());
        assertThrows(
                UnsupportedOperationException.class, () -> provenance.sources().clear());
    }

    @Test
    void rangeRefusesLimitsThatAreNone() {
        assertThrows(IllegalArgumentException.class, () -> new FluidRange(300, 200, 1, 2, "test"));
        assertThrows(IllegalArgumentException.class, () -> new FluidRange(200, 300, 0, 2, "test"));
        assertThrows(IllegalArgumentException.class, () -> new FluidRange(200, Double.NaN, 1, 2, "test"));
        final FluidRange range = new FluidRange(200, 300, 1, 2, "test");
        final OutOfRangeException refusal =
                assertThrows(OutOfRangeException.class, () -> range.requireTemperature(Double.NaN));
        assertTrue(refusal.getMessage().contains("no extrapolation is offered"), refusal::getMessage);
    }
}
