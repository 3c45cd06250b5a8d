package lostwork.examples.recovery;

import static lostwork.examples.recovery.HotGases.AMBIENT;
import static lostwork.examples.recovery.HotGases.flueGas;
import static lostwork.examples.recovery.HotGases.recovery;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.stream.IntStream;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FluidState;
import lostwork.plant.PlantSolveException;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RecoveryTest {
    /** A corner between the limits, a smooth maximum, and the upper end of the search. */
    @ParameterizedTest
    @CsvSource({
        "15, 465, 180, BOTH",
        "15, 465, 30, PINCH",
        "5, 320, 120, PINCH",
        "9, 890, 200, LOWEST_GAS_TEMPERATURE",
        "40, 600, 100, PINCH"
    })
    void noPressureOfAFineGridGivesMore(double flow, double supply, double lowest, Limit limit) {
        final Recovery recovery = recovery(flueGas(flow, supply, lowest));
        assertEquals(limit, recovery.best().limit());
        final RecoveryPlant plant = recovery.best().plant();
        final double best = recovery.netPower().inKilowatts();
        final double from = Math.log(2e5);
        final double to = Math.log(60e5);
        double largest = 0;
        for (int i = 0; i <= 150; i++) {
            final Pressure pressure = Pressure.pascal(Math.exp(from + i * (to - from) / 150));
            largest = Math.max(largest, netPowerAt(plant, pressure));
        }
        assertTrue(best >= largest * (1 - 1e-9), best + " kW is less than " + largest + " kW");
        // The grid has a point within 1.2 % of any pressure; a corner costs at most its slope.
        assertEquals(best, largest, 1e-3 * best);
    }

    private static double netPowerAt(RecoveryPlant plant, Pressure pressure) {
        try {
            return plant.at(pressure).netPower().inKilowatts();
        } catch (PlantSolveException e) {
            return 0; // too much pressure for the temperature of the gas
        }
    }

    @Test
    void bothLimitsHoldAtTheCorner() {
        final OperatingPoint best = recovery(flueGas(15, 465, 180)).best();
        assertEquals(12, best.pinch().inKelvins(), 1e-9);
        assertEquals(180, best.gasOutlet().inCelsius(), 1e-9);
    }

    @Test
    void theMoistureLimitIsKeptAndSaidToBind() {
        final RecoveryDesign dry =
                RecoveryDesign.smallWasteHeatPlant().withLowestVapourFraction(percent(99), "for this test");
        final Recovery recovery = Recovery.of(flueGas(15, 465, 180), AMBIENT, dry, tried -> {});
        assertEquals(0.99, recovery.best().outletVapour().orElseThrow().inFraction(), 1e-9);
        assertTrue(
                recovery.findings().stream().anyMatch(f -> f.startsWith("The moisture limit binds: above ")),
                recovery.findings().toString());
        assertTrue(recovery.netPower().compareTo(recovery(flueGas(15, 465, 180)).netPower()) < 0);
    }

    @Test
    void theUncertaintyIsThatOfAPlantDesignedAnew() {
        final Recovery recovery = recovery(flueGas(15, 465, 180));
        final double net = recovery.netPower().inKilowatts();
        // All rates go with the flow of the gas.
        assertEquals(0.04 * net, kilowatts(recovery.uncertainty(percent(4), kelvins(0))), 1e-9 * net);
        final double hotter = recovery(flueGas(15, 465.05, 180)).netPower().inKilowatts();
        final double colder = recovery(flueGas(15, 464.95, 180)).netPower().inKilowatts();
        final double slope = (hotter - colder) / 0.1;
        assertEquals(6 * slope, kilowatts(recovery.uncertainty(percent(0), kelvins(6))), 1e-4 * 6 * slope);
        assertEquals(
                Math.hypot(0.04 * net, 6 * slope), kilowatts(recovery.uncertainty(percent(4), kelvins(6))), 1e-4 * net);
    }

    private static double kilowatts(Power power) {
        return power.inKilowatts();
    }

    @Test
    void everyPlantObeysBothLawsAndTheLedgerCloses() {
        final Random random = new Random(20_261_201);
        int built = 0;
        for (int i = 0; i < 60; i++) {
            final double supply = 260 + 900 * random.nextDouble();
            final HotGas gas = flueGas(1 + 60 * random.nextDouble(), supply, 12 + (supply - 60) * random.nextDouble());
            try {
                check(recovery(gas));
                built++;
            } catch (NoRecoveryException e) {
                assertTrue(e.getMessage().contains("smallest plant worth a look"), gas + ": " + e.getMessage());
            }
        }
        assertTrue(built >= 40, built + " plants");
    }

    private static void check(Recovery recovery) {
        final HotGas gas = recovery.gas();
        final OperatingPoint best = recovery.best();
        final FluidState hot = gas.fluid().state(gas.supply(), gas.pressure());
        final FluidState cold = gas.fluid().state(gas.lowest(), gas.pressure());
        final Power most =
                AMBIENT.flowExergy(hot).minus(AMBIENT.flowExergy(cold)).times(gas.flow());
        assertTrue(recovery.netPower().compareTo(Power.watts(0)) > 0, gas.toString());
        assertTrue(recovery.netPower().compareTo(most) < 0, gas.toString());
        assertTrue(recovery.ledger().closure().inFraction() <= 1e-9, gas.toString());
        assertEquals(recovery.netPower().si(), recovery.ledger().product().si(), 1e-9 * most.si());
        assertTrue(best.solution().closure().energy() <= 1e-9);
        assertTrue(best.gasOutlet().inCelsius() >= gas.lowest().inCelsius() - 1e-6, gas.toString());
        assertTrue(best.pinch().inKelvins() >= 12 - 1e-6, gas.toString());
        assertTrue(best.outletVapour().map(x -> x.inFraction() >= 0.88 - 1e-9).orElse(true), gas.toString());
    }

    @Test
    void inFrostTheWaterOfTheBooksCountsFromItsColdestStateAndTheySaySo() {
        final ReferenceEnvironment frost = ReferenceEnvironment.of(celsius(-15), mbar(1013));
        final Recovery recovery =
                Recovery.of(flueGas(15, 465, 180), frost, RecoveryDesign.smallWasteHeatPlant(), tried -> {});
        assertEquals(-15, recovery.ledger().environment().temperature().inCelsius(), 1e-9);
        assertTrue(recovery.ledger().closure().inFraction() <= 1e-9);
        assertTrue(
                recovery.findings().stream()
                        .anyMatch(f -> f.startsWith("The model of water does not reach the ambient temperature")),
                recovery.findings().toString());
        // The condenser is not run colder than 30 °C, so frost gives little over a condenser at 34 °C.
        assertTrue(recovery.netPower().compareTo(recovery(flueGas(15, 465, 180)).netPower()) > 0);
    }

    @Test
    void saysThatThinGasIsTooThin() {
        final HotGas gas = flueGas(15, 465, 180);
        final HotGas thin =
                new HotGas("thin", gas.fluid(), gas.flow(), gas.supply(), gas.lowest(), mbar(40), gas.expectedWork());
        final NoRecoveryException none = assertThrows(NoRecoveryException.class, () -> recovery(thin));
        assertEquals(
                "the gas is at 0.04 bar, too thin for a boiler that takes 1.50 kPa of its pressure", none.getMessage());
    }

    @Test
    void theSameGasGivesTheSameBits() {
        final double[] twice = IntStream.range(0, 2)
                .mapToDouble(i -> recovery(flueGas(15, 465, 180)).netPower().si())
                .toArray();
        assertEquals(twice[0], twice[1], 0);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            5    | 240 | 60  | the gas comes with 240 °C, colder than the 250 °C from which a steam plant is reasonable
            0.02 | 465 | 180 | the gas is likely to give 1.57 kW, less than the 50.0 kW of the smallest plant worth a look
            60   | 400 | 390 | the best plant would give
            15   | 400 | 400 | the gas must not be cooled below its supply temperature
            """)
    void saysInWordsWhyThereIsNone(double flow, double supply, double lowest, String why) {
        final NoRecoveryException none =
                assertThrows(NoRecoveryException.class, () -> recovery(flueGas(flow, supply, lowest)));
        assertTrue(none.getMessage().startsWith(why), none.getMessage());
    }
}
