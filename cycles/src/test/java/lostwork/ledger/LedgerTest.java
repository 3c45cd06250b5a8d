package lostwork.ledger;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.NoSuchElementException;
import lostwork.component.Cooler;
import lostwork.component.Heater;
import lostwork.component.Pump;
import lostwork.component.Turbine;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LedgerTest {
    private final ReferenceEnvironment site = ReferenceEnvironment.of(celsius(15), bar(1.013));
    private final Plant.Builder builder = Plant.builder("steam set");
    private final Heater boiler = builder.add(new Heater("boiler"));
    private final Turbine turbine = builder.add(new Turbine("turbine"));
    private final Cooler condenser = builder.add(new Cooler("condenser"));
    private final Pump pump = builder.add(new Pump("feed pump"));
    private final Plant plant = builder.circuit(Water.industrial(), boiler, turbine, condenser, pump)
            .build();
    private final Solution solution = plant.specify()
            .given(turbine.inlet().pressure(), bar(60))
            .given(turbine.inlet().temperature(), celsius(480))
            .given(turbine.isentropicEfficiency(), percent(85))
            .given(condenser.outlet().pressure(), bar(0.08))
            .given(condenser.outlet().vapourFraction(), percent(0))
            .given(pump.isentropicEfficiency(), percent(70))
            .given(boiler.inlet().flow(), kilogramsPerSecond(10))
            .given(boiler.heat().temperature(), celsius(900))
            .given(condenser.heat().temperature(), celsius(15))
            .solve();
    private final Ledger ledger =
            Ledger.of(solution, site, BoundaryMarks.byDirection().with(pump.shaft(), BoundaryRole.PRODUCT));

    @Test
    void bothBooksAgreeAndTheTotalsClose() {
        assertTrue(ledger.closure().si() <= 1e-9, ledger.toString());
        assertEquals(4, ledger.components().size());
        ledger.components().forEach(c -> assertTrue(c.destruction().si() >= 0, c.toString()));
    }

    /** By hand: fuel is (1 − T0/T) of the boiler duty, the product is the net power. */
    @Test
    void totalsFollowFromThePowersAndHeats() {
        final double duty = solution.value(boiler.duty()).si();
        final double net = solution.value(turbine.power()).si()
                - solution.value(pump.power()).si();
        assertEquals((1 - 288.15 / 1173.15) * duty, ledger.fuel().si(), 1e-9 * duty);
        assertEquals(net, ledger.product().si(), 1e-9 * duty);
        assertEquals(0, ledger.loss().si(), 1e-9 * duty);
        assertEquals(net / ledger.fuel().si(), ledger.efficiency().si(), 1e-12);
    }

    @Test
    void aTurbineIsJudgedByItsPowerOverTheDropOfExergy() {
        final ComponentExergy account = ledger.of(turbine);
        final double drop = 10
                * (site.flowExergy(solution.state(turbine.inlet())).si()
                        - site.flowExergy(solution.state(turbine.outlet())).si());
        assertEquals(drop, account.fuel().orElseThrow().si(), 1e-9 * drop);
        assertEquals(
                solution.value(turbine.power()).si() / drop,
                account.efficiency().orElseThrow().si(),
                1e-12);
        assertTrue(ledger.of(condenser).fuel().isEmpty());
    }

    /** Water has no liquid below 0 °C: the circuit counts from there, and the books close all the same. */
    @Test
    void booksOfAFrostyDayClose() {
        final ReferenceEnvironment frost = ReferenceEnvironment.of(celsius(-12), bar(1.013));
        final Ledger winter =
                Ledger.of(solution, frost, BoundaryMarks.byDirection().with(pump.shaft(), BoundaryRole.PRODUCT));
        assertTrue(winter.closure().si() <= 1e-9, winter.toString());
        assertTrue(winter.toString().contains("does not reach the ambient temperature"), winter.toString());
        assertEquals(
                261.15 * solution.entropyGeneration(turbine).si(),
                winter.of(turbine).destruction().si(),
                1e-9 * winter.fuel().si());
    }

    @Test
    void theRankingStartsWithTheLargestDestruction() {
        assertEquals("boiler", ledger.ranking().get(0).component());
        assertEquals("feed pump", ledger.ranking().get(3).component());
    }

    @Test
    void aMarkAwayFromTheBoundaryIsRefused() {
        final NoSuchElementException e = assertThrows(
                NoSuchElementException.class,
                () -> Ledger.of(solution, site, BoundaryMarks.byDirection().with(turbine.inlet(), BoundaryRole.LOSS)));
        assertTrue(e.getMessage().contains("turbine inlet"), e.getMessage());
    }

    @Test
    void printsAndWritesFiles(@TempDir Path folder) throws Exception {
        final String text = ledger.toString();
        assertTrue(text.contains("Exergy ledger of plant \"steam set\""), text);
        assertTrue(text.contains("Closure:"), text);
        ledger.writeCsv(folder.resolve("ledger.csv"));
        ledger.writeJson(folder.resolve("ledger.json"));
        final String csv = Files.readString(folder.resolve("ledger.csv"));
        assertTrue(csv.startsWith("component,fuel in kW,product in kW,"), csv);
        assertTrue(csv.contains("turbine outlet → condenser inlet"), csv);
        final String json = Files.readString(folder.resolve("ledger.json"));
        assertTrue(json.contains("\"component\": \"turbine\""), json);
    }
}
