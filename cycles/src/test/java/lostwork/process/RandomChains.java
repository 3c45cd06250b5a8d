package lostwork.process;

import java.util.Random;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.SaturationModel;
import lostwork.quantity.Mass;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** Draws chains and cycles of any fluid within a window of states. */
final class RandomChains {
    private static final int ATTEMPTS = 200;

    private final Fluid fluid;
    private final double lowestKelvin;
    private final double highestKelvin;
    private final double lowestPascal;
    private final double highestPascal;

    RandomChains(Fluid fluid, double lowestKelvin, double highestKelvin, double lowestPascal, double highestPascal) {
        this.fluid = fluid;
        this.lowestKelvin = lowestKelvin;
        this.highestKelvin = highestKelvin;
        this.lowestPascal = lowestPascal;
        this.highestPascal = highestPascal;
    }

    private double pascal(Random random) {
        return lowestPascal * Math.pow(highestPascal / lowestPascal, random.nextDouble());
    }

    private Temperature temperature(Random random) {
        return Temperature.kelvin(lowestKelvin + (highestKelvin - lowestKelvin) * random.nextDouble());
    }

    private FluidState state(Random random) {
        final SaturationModel saturation = fluid.model().saturation();
        if (saturation != null && 0.99 * saturation.criticalTemperature() > lowestKelvin && random.nextInt(3) == 0) {
            final double highest = 0.99 * saturation.criticalTemperature();
            final double kelvin = lowestKelvin + (highest - lowestKelvin) * random.nextDouble();
            return fluid.state(Temperature.kelvin(kelvin), Ratio.fraction(random.nextDouble()));
        }
        return fluid.state(temperature(random), Pressure.pascal(pascal(random)));
    }

    /** {@return a chain of one to four steps; what the range of the fluid refuses is drawn again} */
    ProcessChain chain(long seed) {
        final Random random = new Random(seed);
        for (int start = 0; start < ATTEMPTS; start++) {
            ProcessChain chain = ClosedMass.of(fluid, Mass.kilograms(0.1 + random.nextDouble()))
                    .startingAt(state(random));
            final int length = 1 + random.nextInt(4);
            for (int i = 0; i < ATTEMPTS && isInside(chain.start()); i++) {
                chain = longer(chain, random);
                if (chain.steps().size() == length) {
                    return chain;
                }
            }
        }
        throw new IllegalStateException("no chain found for the seed " + seed);
    }

    private ProcessChain longer(ProcessChain chain, Random random) {
        try {
            final ProcessChain longer = step(chain, random);
            return isInside(longer.end()) && isHeld(longer.lastStep()) ? longer : chain;
        } catch (ProcessException refusal) {
            if (refusal.reason() != ProcessException.Reason.END_NOT_REACHED) {
                throw refusal;
            }
            return chain;
        }
    }

    private boolean isInside(FluidState state) {
        final double kelvin = state.temperature().si();
        final double pascal = state.pressure().si();
        return kelvin >= lowestKelvin && kelvin <= highestKelvin && pascal >= lowestPascal && pascal <= highestPascal;
    }

    /** A path may leave the range between two ends that lie in it; such a step has no areas. */
    private static boolean isHeld(ProcessStep step) {
        try {
            step.path(33);
            return true;
        } catch (RuntimeException refusal) {
            return false;
        }
    }

    private ProcessChain step(ProcessChain chain, Random random) {
        final Pressure pressure = Pressure.pascal(pascal(random));
        final Temperature temperature = temperature(random);
        final SpecificVolume volume = chain.end().volume().times(Math.exp(6 * random.nextDouble() - 3));
        switch (random.nextInt(12)) {
            case 0:
                return chain.isothermalTo(pressure);
            case 1:
                return chain.isothermalTo(volume);
            case 2:
                return chain.isentropicTo(pressure);
            case 3:
                return chain.isentropicTo(volume);
            case 4:
                return chain.isentropicTo(temperature);
            case 5:
                return chain.isochoricTo(pressure);
            case 6:
                return chain.isochoricTo(temperature);
            case 7:
                return chain.isobaricTo(temperature);
            case 8:
                return chain.isobaricTo(volume);
            case 9:
                return chain.polytropicTo(volume, 3 * random.nextDouble() - 1);
            case 10:
                return chain.polytropicTo(pressure, 0.2 + 2 * random.nextDouble());
            default:
                return chain.isothermalAdding(SpecificEnergy.joulesPerKilogram(3e5 * (random.nextDouble() - 0.5)));
        }
    }

    /** {@return a chain that comes back, by one or two more steps} */
    ProcessCycle cycle(long seed) {
        for (long i = 0; i < ATTEMPTS; i++) {
            final ProcessChain chain = chain(seed + i * 1_000_003);
            try {
                final ProcessCycle cycle = back(chain, new Random(seed));
                if (cycle.steps().stream().allMatch(step -> isInside(step.to()) && isHeld(step))) {
                    return cycle;
                }
            } catch (ProcessException refusal) {
                if (refusal.reason() != ProcessException.Reason.END_NOT_REACHED
                        && refusal.reason() != ProcessException.Reason.EXPONENT) {
                    throw refusal;
                }
            }
        }
        throw new IllegalStateException("no cycle found for the seed " + seed);
    }

    private static ProcessCycle back(ProcessChain chain, Random random) {
        final FluidState start = chain.start();
        switch (random.nextInt(5)) {
            case 0:
                return chain.isochoricTo(start.pressure()).closedBy(ProcessKind.ISOBARIC);
            case 1:
                return chain.isobaricTo(start.volume()).closedBy(ProcessKind.ISOCHORIC);
            case 2:
                return chain.isentropicTo(start.volume()).closedBy(ProcessKind.ISOCHORIC);
            case 3:
                return chain.isentropicTo(start.pressure()).closedBy(ProcessKind.ISOBARIC);
            default:
                return chain.closedBy(ProcessKind.POLYTROPIC);
        }
    }
}
