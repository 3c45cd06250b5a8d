package lostwork.plant;

import static lostwork.quantity.Conductance.wattsPerKelvin;
import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.SplittableRandom;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import lostwork.component.Discharge;
import lostwork.component.HeatExchanger;
import lostwork.component.Heater;
import lostwork.component.Supply;
import lostwork.component.Turbine;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a solve promises beside its values: threads, warm starts, limits, names, and that a specification outlives a plant. */
class SolveContractTest {
    /** A steam turbine between two boundaries. */
    private static final class Line {
        final Plant.Builder builder = Plant.builder("line");
        final Supply steam = builder.add(new Supply("steam", Water.industrial()));
        final Turbine turbine = builder.add(new Turbine("turbine"));
        final Discharge exhaust = builder.add(new Discharge("exhaust"));
        final Plant plant = builder.connect(steam.outlet(), turbine.inlet())
                .connect(turbine.outlet(), exhaust.inlet())
                .build();
        final Specification design = plant.specify()
                .given(steam.flow(), kilogramsPerSecond(2))
                .given(steam.temperature(), celsius(350))
                .given(steam.pressure(), bar(60))
                .given(exhaust.pressure(), bar(0.1))
                .given(turbine.isentropicEfficiency(), percent(80));
    }

    /** Two targets of one exchanger that no state fulfils: the solve tries long before it says so. */
    private static Specification unreachable() {
        final Plant.Builder b = Plant.builder("exchange");
        final Supply gas = b.add(new Supply("gas", DryAir.standard()));
        final Supply water = b.add(new Supply("water", Water.industrial()));
        final HeatExchanger exchanger = b.add(new HeatExchanger("exchanger"));
        b.connect(gas.outlet(), exchanger.hotInlet())
                .connect(exchanger.hotOutlet(), b.add(new Discharge("stack")).inlet());
        b.connect(water.outlet(), exchanger.coldInlet())
                .connect(
                        exchanger.coldOutlet(),
                        b.add(new Discharge("hot water")).inlet());
        return b.build()
                .specify()
                .given(gas.flow(), kilogramsPerSecond(10))
                .given(gas.temperature(), celsius(400))
                .given(gas.pressure(), bar(1))
                .given(water.flow(), kilogramsPerSecond(3))
                .given(water.temperature(), celsius(20))
                .given(water.pressure(), bar(10))
                .given(exchanger.effectiveness(), percent(70))
                .given(exchanger.conductance(), wattsPerKelvin(5000));
    }

    @Test
    void eightThreadsSolveOnePlanBitByBitAlike() throws Exception {
        final List<Specification> cases = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            final SplittableRandom random = new SplittableRandom(50 + i);
            cases.add(HeatEngineCase.engine(random, new SplittableRandom(1)).specification());
        }
        final List<double[]> expected =
                cases.stream().map(s -> values(s.solve())).toList();
        final ExecutorService pool = Executors.newFixedThreadPool(8);
        try {
            final List<Callable<List<double[]>>> work = IntStream.range(0, 8)
                    .<Callable<List<double[]>>>mapToObj(k ->
                            () -> cases.stream().map(s -> values(s.solve())).toList())
                    .toList();
            for (Future<List<double[]>> done : pool.invokeAll(work)) {
                for (int i = 0; i < cases.size(); i++) {
                    assertArrayEquals(expected.get(i), done.get().get(i)); // NaN equals NaN, everything else bit by bit
                }
            }
        } finally {
            pool.shutdown();
        }
    }

    private static double[] values(Solution s) {
        return IntStream.range(0, s.plant().layout().slots.size())
                .mapToDouble(s::si)
                .toArray();
    }

    @Test
    void aWarmStartFindsWhatAColdOneFinds() {
        for (int i = 0; i < 40; i++) {
            final SplittableRandom random = new SplittableRandom(900 + i);
            final Specification spec =
                    HeatEngineCase.engine(random, new SplittableRandom(1)).specification();
            final Variable<?> changed = spec.givenVariables().get(0);
            final Specification near = scaled(spec, changed, 1.02);
            final double[] cold = values(spec.solve());
            final double[] warm = values(spec.solve(SolveOptions.defaults().startingFrom(near.solve())));
            for (int slot = 0; slot < cold.length; slot++) {
                final double scale = spec.plant().layout().scales.get(slot).at(cold[slot]);
                assertEquals(cold[slot], warm[slot], 1e-9 * scale);
            }
        }
    }

    private static <Q extends lostwork.quantity.ScalarQuantity<Q, ?>> Specification scaled(
            Specification spec, Variable<Q> variable, double factor) {
        return spec.with(variable, variable.kind().ofSi(spec.si(variable) * factor));
    }

    @Test
    void aWarmStartMayComeFromAnotherSpecification() {
        final Line line = new Line();
        final Solution wet = line.design.solve();
        final Specification other = line.design
                .release(line.turbine.isentropicEfficiency())
                .given(line.exhaust.inlet().superheat(), kelvins(20));
        final Solution warm =
                other.solve(SolveOptions.defaults().startingFrom(wet).with(SolveOptions.SecondLaw.REPORTED));
        final Solution cold = other.solve(SolveOptions.defaults().with(SolveOptions.SecondLaw.REPORTED));
        assertArrayEquals(values(cold), values(warm), 1e-6);
    }

    /** From the wish to the end, at any moment of a solve; the best of some tries, since the machine does other work too. */
    @Test
    void cancellingEndsASolveAtOnce() {
        final Specification spec = unreachable();
        spec.plan();
        long shortest = Long.MAX_VALUE;
        for (int attempt = 1; attempt <= 6; attempt++) {
            final long wished = System.nanoTime() + 40_000_000L * attempt;
            final PlantSolveException e = assertThrows(
                    PlantSolveException.class,
                    () -> spec.solve(SolveOptions.defaults().cancelledBy(() -> System.nanoTime() > wished)));
            shortest = Math.min(shortest, System.nanoTime() - wished);
            assertEquals(PlantSolveException.Reason.CANCELLED, e.reason());
        }
        assertTrue(shortest < 50_000_000L, "ended after " + shortest + " ns");
    }

    @Test
    void theTimeLimitHoldsInsideABlock() {
        final Specification spec = unreachable();
        spec.plan();
        final long start = System.nanoTime();
        final PlantSolveException e = assertThrows(
                PlantSolveException.class,
                () -> spec.solve(SolveOptions.defaults().within(Duration.ofMillis(100))));
        assertEquals(PlantSolveException.Reason.OUT_OF_TIME, e.reason());
        assertTrue(System.nanoTime() - start < 1_000_000_000L);
    }

    @Test
    void anyTimeLimitIsAccepted() {
        final Line line = new Line();
        assertTrue(line.design
                        .solve(SolveOptions.defaults().within(Duration.ofSeconds(Long.MAX_VALUE)))
                        .largestResidual()
                < 1e-12);
    }

    @Test
    void aFailureIsShortEnoughToRead() {
        final PlantSolveException e =
                assertThrows(PlantSolveException.class, () -> unreachable().solve());
        assertTrue(e.getMessage().length() < 900, e.getMessage());
        assertTrue(e.getMessage().contains("exchanger: effectiveness"), e.getMessage());
        assertTrue(e.getMessage().contains("exchanger conductance"), e.getMessage());
    }

    @Test
    void aStateOnTheSaturationLineIsCalledThat() {
        final Line line = new Line();
        final Pressure p = bar(10);
        final Specification spec = line.design
                .with(line.steam.pressure(), p)
                .with(line.steam.temperature(), Water.industrial().saturation(p).temperature());
        final PlantSolveException e = assertThrows(PlantSolveException.class, spec::solve);
        assertEquals(PlantSolveException.Reason.UNDETERMINED, e.reason());
        assertTrue(
                e.getMessage().contains("steam outlet temperature and steam outlet pressure lie on the saturation"),
                e.getMessage());
    }

    @Test
    void aSpecificationOutlivesItsPlant() {
        final Line one = new Line();
        final Line two = new Line();
        final Specification moved = one.design.on(two.plant);
        assertEquals(one.design.givenVariables(), moved.givenVariables());
        final Solution a = one.design.solve();
        final Solution b = moved.solve();
        assertArrayEquals(values(a), values(b));
        assertEquals(a.value(one.turbine.power()), b.value(two.turbine.power()));
        assertEquals(a.value(two.turbine.power()), b.value(one.turbine.power()));
        assertEquals(
                a.state(two.turbine.outlet()).enthalpy(),
                b.state(one.turbine.outlet()).enthalpy());
        final Plant.Builder b2 = Plant.builder("other");
        final Heater heater = b2.add(new Heater("heater"));
        final Plant other = b2.circuit(Water.industrial(), heater).build();
        assertThrows(NoSuchElementException.class, () -> one.design.on(other));
    }

    @Test
    void aVariableLookedUpByNameKeepsItsLimits() {
        final Line line = new Line();
        final Variable<Ratio> x = line.plant.variable("steam", "outlet vapour fraction", Ratio.KIND);
        assertEquals(1, x.highest());
        final OutOfRangeException e = assertThrows(
                OutOfRangeException.class, () -> line.plant.specify().given(x, percent(120)));
        assertTrue(e.getMessage().startsWith("steam outlet vapour fraction = 1.2"), e.getMessage());
    }

    @Test
    void missingNamesAreAnsweredWithNearOnes() {
        final Line line = new Line();
        final var variable = assertThrows(
                NoSuchElementException.class, () -> line.plant.variable("steam", "oulet presure", Pressure.KIND));
        assertTrue(
                variable.getMessage().contains("the variables of steam are outlet pressure,"), variable.getMessage());
        final var component =
                assertThrows(NoSuchElementException.class, () -> line.plant.component("turbin", Turbine.class));
        assertTrue(component.getMessage().contains("its components are turbine, "), component.getMessage());
        final var kind = assertThrows(
                NoSuchElementException.class, () -> line.plant.variable("steam", "outlet pressure", Ratio.KIND));
        assertEquals("\"steam outlet pressure\" of plant \"line\" is a pressure, not a ratio", kind.getMessage());
        final var foreign = assertThrows(
                NoSuchElementException.class,
                () -> line.plant.specify().given(new Turbine("other").isentropicEfficiency(), percent(90)));
        assertTrue(foreign.getMessage().contains("\"other isentropic efficiency\""), foreign.getMessage());
        assertThrows(NoSuchElementException.class, () -> line.plant.specify().with(line.steam.pressure(), bar(1)));
    }

    @Test
    @SuppressWarnings("NullAway")
    void nullsAreNamed() {
        final Line line = new Line();
        final var value = assertThrows(
                NullPointerException.class, () -> line.plant.specify().given(line.steam.pressure(), null));
        assertEquals("value of steam outlet pressure", value.getMessage());
        final var variable = assertThrows(
                NullPointerException.class, () -> line.plant.specify().given(null, percent(1)));
        assertEquals("variable", variable.getMessage());
    }

    @Test
    void aPropertyThatAStateLacksHasNoDerivative() {
        final Line line = new Line();
        final Solution wet = line.design.solve();
        assertThrows(
                IllegalStateException.class,
                () -> wet.sensitivity(line.turbine.outlet().superheat(), line.steam.pressure()));
    }

    @Test
    void aSolutionIsStoredAsJsonAndAsCsv(@TempDir Path folder) throws IOException {
        final Solution s = new Line().design.solve();
        final String json = s.toJson();
        assertTrue(json.contains("\"stream\": \"steam outlet → turbine inlet\""), json);
        assertTrue(json.contains("\"variable\": \"isentropic efficiency\""), json);
        assertTrue(json.contains("\"largest scaled residual\""), json);
        final Path file = folder.resolve("line.csv");
        s.writeCsv(file);
        final List<String> lines = Files.readAllLines(file);
        assertTrue(lines.get(0).startsWith("stream,fluid,flow in kg/s,temperature in °C"), lines.get(0));
        assertTrue(lines.stream().anyMatch(l -> l.startsWith("turbine,isentropic efficiency,0.8,")), lines.toString());
    }

    @Test
    void twoPartsOfOneNameAreRefused() {
        final class Doubled extends Component {
            Doubled(boolean ports) {
                super("doubled");
                if (ports) {
                    inlet("inlet");
                    outlet("inlet");
                } else {
                    variable("efficiency", Ratio.KIND);
                    variable("efficiency", Ratio.KIND);
                }
            }

            @Override
            protected void describe(Equations e) {}
        }
        assertThrows(IllegalArgumentException.class, () -> new Doubled(true));
        assertThrows(IllegalArgumentException.class, () -> new Doubled(false));
    }

    /** A thousand machines one after the other, the first state unknown: the longest alternating path there is. */
    @Test
    void longChainsNeedNoDeepStack() throws Exception {
        final int machines = 1000;
        final Plant.Builder b = Plant.builder("chain");
        final Supply supply = b.add(new Supply("supply", DryAir.standard()));
        Outlet last = supply.outlet();
        for (int i = 0; i < machines; i++) {
            final Heater heater = b.add(new Heater("heater " + i));
            b.connect(last, heater.inlet());
            last = heater.outlet();
        }
        final Discharge end = b.add(new Discharge("end"));
        final Plant plant = b.connect(last, end.inlet()).build();
        Specification spec = plant.specify()
                .given(supply.flow(), kilogramsPerSecond(1))
                .given(end.pressure(), bar(1))
                .given(end.temperature(), celsius(400));
        for (int i = 0; i < machines; i++) {
            spec = spec.given(plant.component("heater " + i, Heater.class).duty(), lostwork.quantity.Power.watts(300));
        }
        final Specification all = spec;
        final List<Throwable> thrown = new ArrayList<>();
        final Thread shallow = new Thread(
                null,
                () -> {
                    final Solution s = all.solve();
                    assertTrue(s.closure().energy() < 1e-9);
                    assertTrue(s.value(supply.temperature()).inCelsius() < 120);
                },
                "shallow",
                256 * 1024);
        shallow.setUncaughtExceptionHandler((t, e) -> thrown.add(e));
        shallow.start();
        shallow.join();
        assertEquals(List.of(), thrown);
    }
}
