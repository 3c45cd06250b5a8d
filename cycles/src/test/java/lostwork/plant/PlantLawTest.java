package lostwork.plant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

/**
 * The laws that every plant obeys, on plants drawn at random and solved without start values: no engine beats Carnot, no
 * refrigerator and no heat pump beats its reversed counterpart, every balance closes, and the order of building plays no
 * part.
 */
class PlantLawTest {
    private static final double CLOSES = 1e-9;

    @Property(seed = "20261201")
    void noEngineBeatsCarnot(@ForAll long seed) {
        final HeatEngineCase engine = HeatEngineCase.engine(new SplittableRandom(seed), new SplittableRandom(1));
        final Solution s = engine.specification().solve();
        final double heat = sum(s, engine.fromHot());
        final double net = s.value(engine.net()).si();
        final double carnot = 1 - engine.cold().si() / engine.hot().si();
        // As powers, so that it also binds a plant whose compressor runs hotter than the reservoir and that takes
        // power.
        assertTrue(
                net <= carnot * heat + CLOSES * Math.max(Math.abs(heat), Math.abs(net)),
                () -> net + " > " + carnot + " of " + heat + "\n" + s);
    }

    @Property(seed = "20261202")
    void noRefrigeratorAndNoHeatPumpBeatsTheReversedEngine(@ForAll long seed) {
        final HeatEngineCase machine = HeatEngineCase.refrigerator(new SplittableRandom(seed), new SplittableRandom(1));
        final Solution s = machine.specification().solve();
        final double work = -s.value(machine.net()).si();
        final double hot = machine.hot().si();
        final double cold = machine.cold().si();
        assertTrue(work > 0, s::toString);
        assertTrue(sum(s, machine.fromCold()) / work <= cold / (hot - cold) * (1 + 1e-9), s::toString);
        assertTrue(sum(s, machine.fromHot()) / work <= hot / (hot - cold) * (1 + 1e-9), s::toString);
    }

    @Property(seed = "20261203")
    void massEnergyAndEntropyClose(@ForAll long seed) {
        final SplittableRandom random = new SplittableRandom(seed);
        final HeatEngineCase any = random.nextBoolean()
                ? HeatEngineCase.engine(random, new SplittableRandom(1))
                : HeatEngineCase.refrigerator(random, new SplittableRandom(1));
        final Solution s = any.specification().solve();
        final Closure closure = s.closure();
        assertTrue(closure.mass() <= CLOSES, s::toString);
        assertTrue(closure.energy() <= CLOSES, s::toString);
        // Entropy: what the components generate leaves through the reservoirs, since the plant is closed.
        final double generated = closure.entropyGeneration().values().stream()
                .mapToDouble(g -> g.si())
                .sum();
        final double atHot = sum(s, any.fromHot()) / any.hot().si();
        final double atCold = sum(s, any.fromCold()) / any.cold().si();
        final double exported = any.fromHot().get(0).isInlet() ? atCold - atHot : atHot - atCold;
        assertEquals(exported, generated, CLOSES * Math.max(atHot, atCold), s::toString);
        assertTrue(generated >= -CLOSES * atHot, s::toString);
    }

    @Property(seed = "20261204")
    void theOrderOfBuildingPlaysNoPart(@ForAll long seed) {
        final HeatEngineCase one = drawn(seed, 1);
        final HeatEngineCase two = drawn(seed, seed ^ 0x5DEECE66DL);
        final Solution a = one.specification().solve();
        final Solution b = two.specification().solve();
        final List<Layout.Slot> slots = a.plant().layout().slots;
        for (Layout.Slot slot : slots) {
            assertEquals(
                    Double.doubleToLongBits(a.si(a.plant().slotOf(slot.variable()))),
                    Double.doubleToLongBits(b.si(b.plant().slotOf(slot.variable()))),
                    () -> slot.variable() + " of\n" + a);
        }
    }

    private static HeatEngineCase drawn(long seed, long order) {
        final SplittableRandom random = new SplittableRandom(seed);
        return random.nextBoolean()
                ? HeatEngineCase.engine(random, new SplittableRandom(order))
                : HeatEngineCase.refrigerator(random, new SplittableRandom(order));
    }

    private static double sum(Solution s, List<HeatPort> ports) {
        return ports.stream().mapToDouble(p -> s.value(p.rate()).si()).sum();
    }
}
