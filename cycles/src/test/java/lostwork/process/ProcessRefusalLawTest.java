package lostwork.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.quantity.Mass;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

/** Whatever is asked, the answer is a step that keeps its promise or a refusal with words; nothing else comes out. */
class ProcessRefusalLawTest {
    private static final List<Fluid> FLUIDS = List.of(
            PerfectGas.of("air", MolarMass.gramsPerMole(28.96), Ratio.fraction(1.4)),
            DryAir.standard(),
            Water.industrial(),
            Fluid.of(new VanDerWaalsFluid()));

    @Property(tries = 400, seed = "20261208")
    void wildEndsAreReachedOrRefusedInWords(@ForAll long seed) {
        final Random random = new Random(seed);
        for (Fluid fluid : FLUIDS) {
            final ProcessChain chain = ClosedMass.of(fluid, Mass.kilograms(1))
                    .startingAt(
                            Temperature.kelvin(290 + 400 * random.nextDouble()), Pressure.bar(1 + random.nextInt(150)));
            try {
                final ProcessStep step = wild(chain, random).lastStep();
                assertTrue(
                        Double.isFinite(step.work().si())
                                && Double.isFinite(step.heat().si()),
                        step::toString);
            } catch (ProcessException | OutOfRangeException refusal) {
                assertTrue(refusal.getMessage().length() > 40, refusal.getMessage());
            }
        }
    }

    /** What the kind of step holds constant is the same at both ends. */
    private static void assertHeld(ProcessStep step) {
        final FluidState from = step.from();
        final FluidState to = step.to();
        final double gap = switch (step.kind()) {
            case ISOTHERMAL -> to.temperature().si() / from.temperature().si() - 1;
            case ISOBARIC -> to.pressure().si() / from.pressure().si() - 1;
            case ISOCHORIC -> to.volume().si() / from.volume().si() - 1;
            case ISENTROPIC ->
                (to.entropy().si() - from.entropy().si())
                        / from.isochoricHeatCapacity().si();
            case POLYTROPIC ->
                Math.log(to.pressure().si() / from.pressure().si())
                        + step.exponent().orElseThrow()
                                * Math.log(to.volume().si() / from.volume().si());
        };
        final double room = 1 + Math.abs(step.exponent().orElse(0));
        assertEquals(0, gap, 1e-9 * room, step::toString);
    }

    private static double wildNumber(Random random) {
        return Math.pow(10, 24 * (random.nextDouble() - 0.5)) * (random.nextInt(10) == 0 ? 0 : 1);
    }

    private static ProcessChain wild(ProcessChain chain, Random random) {
        final double number = wildNumber(random);
        final Pressure pressure = Pressure.pascal(number);
        final Temperature temperature = Temperature.kelvin(number);
        final SpecificVolume volume = SpecificVolume.cubicMetresPerKilogram(number);
        final SpecificEnergy heat = SpecificEnergy.joulesPerKilogram(random.nextBoolean() ? number : -number);
        final double exponent = random.nextBoolean() ? 4 * random.nextDouble() - 2 : wildNumber(random);
        switch (random.nextInt(17)) {
            case 0:
                return chain.isothermalTo(pressure);
            case 1:
                return chain.isothermalTo(volume);
            case 2:
                return chain.isothermalAdding(heat);
            case 3:
                return chain.isothermalTo(Ratio.fraction(number));
            case 4:
                return chain.isentropicTo(pressure);
            case 5:
                return chain.isentropicTo(volume);
            case 6:
                return chain.isentropicTo(temperature);
            case 7:
                return chain.isochoricTo(pressure);
            case 8:
                return chain.isochoricTo(temperature);
            case 9:
                return chain.isochoricAdding(heat);
            case 10:
                return chain.isobaricTo(temperature);
            case 11:
                return chain.isobaricTo(volume);
            case 12:
                return chain.isobaricAdding(heat);
            case 13:
                return chain.isobaricTo(Ratio.fraction(number));
            case 14:
                return chain.polytropicTo(pressure, exponent);
            case 15:
                return chain.polytropicTo(volume, exponent);
            default:
                return chain.polytropicTo(temperature, exponent);
        }
    }
}
