package lostwork.process;

import static lostwork.process.PressureRatio.loweredByFactor;
import static lostwork.process.PressureRatio.raisedByFactor;
import static lostwork.process.VolumeRatio.compressionRatio;
import static lostwork.process.VolumeRatio.expansionRatio;
import static lostwork.quantity.Mass.kilograms;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.SpecificEnergy.kilojoulesPerKilogram;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.exergy.Carnot;
import lostwork.exergy.GouyStodola;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.Phase;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.process.ProcessException.Reason;
import lostwork.quantity.Energy;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Volume;
import org.junit.jupiter.api.Test;

class ProcessChainTest {
    private static final double K = 1.4;
    private static final PerfectGas GAS = PerfectGas.of("air", MolarMass.gramsPerMole(28.96), Ratio.fraction(K));
    private static final double R = 8.31446261815324 / 0.02896;
    private static final double CV = R / (K - 1);
    private static final ReferenceEnvironment SITE = ReferenceEnvironment.of(celsius(15), bar(1));

    private static ProcessChain gas(double massKilograms) {
        return ClosedMass.of(GAS, kilograms(massKilograms)).startingAt(kelvin(300), bar(1));
    }

    private static void assertClose(double expected, double actual) {
        assertEquals(expected, actual, 1e-11 * Math.abs(expected));
    }

    /** w = R T ln(v2/v1), q = w. */
    @Test
    void isothermalExpansionOfPerfectGas() {
        final ProcessStep step = gas(2).isothermalTo(expansionRatio(5)).lastStep();
        assertClose(2 * R * 300 * Math.log(5), step.work().inJoules());
        assertClose(2 * R * 300 * Math.log(5), step.heat().inJoules());
        assertClose(2 * R * Math.log(5), step.entropyChange().inJoulesPerKelvin());
        assertEquals(0, step.energyChange().inJoules(), 1e-9);
    }

    /** T2/T1 = r^(k−1), w = cv (T1 − T2). */
    @Test
    void isentropicCompressionOfPerfectGas() {
        final ProcessStep step = gas(1).isentropicTo(compressionRatio(10)).lastStep();
        assertClose(300 * Math.pow(10, K - 1), step.to().temperature().inKelvin());
        assertClose(CV * (300 - 300 * Math.pow(10, K - 1)), step.work().inJoules());
        assertEquals(0, step.heat().inJoules());
        assertClose(step.work().si(), step.pressureVolumeArea().si());
    }

    /** w = R (T1 − T2)/(n − 1), q = w (k − n)/(k − 1). */
    @Test
    void polytropicCompressionOfPerfectGas() {
        final double n = 1.25;
        final double end = 300 * Math.pow(8, (n - 1) / n);
        final ProcessStep step = gas(1).polytropicTo(raisedByFactor(8), n).lastStep();
        assertClose(end, step.to().temperature().inKelvin());
        assertClose(R * (300 - end) / (n - 1), step.work().inJoules());
        assertEquals(R * (300 - end) / (n - 1) * (K - n) / (K - 1), step.heat().inJoules(), 1e-7);
        assertEquals(n, step.exponent().orElseThrow());
        final ProcessStep byTemperature = gas(1).polytropicTo(kelvin(end), n).lastStep();
        assertClose(8e5, byTemperature.to().pressure().inPascal());
        final ProcessStep byState = gas(1).polytropicTo(step.to()).lastStep();
        assertClose(n, byState.exponent().orElseThrow());
    }

    @Test
    void polytropeContainsTheOtherKinds() {
        assertClose(
                gas(1).isothermalTo(bar(7)).netWork().si(),
                gas(1).polytropicTo(bar(7), 1).netWork().si());
        assertClose(
                gas(1).isothermalTo(bar(7)).netWork().si(),
                gas(1).polytropicTo(bar(7), Math.nextUp(1.0)).netWork().si());
        assertClose(
                gas(1).isentropicTo(bar(7)).netWork().si(),
                gas(1).polytropicTo(bar(7), K).netWork().si());
        assertClose(
                gas(1).isobaricTo(expansionRatio(3)).netHeat().si(),
                gas(1).polytropicTo(expansionRatio(3), 0).netHeat().si());
    }

    @Test
    void endsGivenInDifferentWaysMeet() {
        final FluidState byRatio = gas(0.5).isobaricTo(expansionRatio(2)).end();
        final Volume volume =
                SpecificVolume.cubicMetresPerKilogram(R * 600 / 1e5).times(kilograms(0.5));
        for (ProcessChain chain : List.of(
                gas(0.5).isobaricTo(kelvin(600)),
                gas(0.5).isobaricTo(volume),
                gas(0.5).isobaricAdding(Energy.joules(0.5 * (CV + R) * 300)),
                gas(0.5).polytropicTo(volume, 0))) {
            assertClose(byRatio.temperature().si(), chain.end().temperature().si());
            assertClose(byRatio.volume().si(), chain.end().volume().si());
        }
        assertClose(
                gas(1).isothermalTo(loweredByFactor(4)).end().volume().si(),
                gas(1).isothermalAdding(Energy.joules(R * 300 * Math.log(4)))
                        .end()
                        .volume()
                        .si());
        assertClose(
                gas(1).isochoricTo(raisedByFactor(2)).end().temperature().si(),
                gas(1).isochoricAdding(Energy.joules(CV * 300))
                        .end()
                        .temperature()
                        .si());
    }

    /** η = 1 − Tc/Th, whatever the fluid; here for a gas. */
    @Test
    void carnotCycleOfPerfectGas() {
        final ProcessCycle carnot = gas(1).isentropicTo(kelvin(900))
                .isothermalTo(expansionRatio(3))
                .isentropicTo(kelvin(300))
                .closedBy(ProcessKind.ISOTHERMAL);
        assertClose(1 - 300.0 / 900, carnot.thermalEfficiency().si());
        assertEquals(
                0, carnot.entropyGenerationBetween(kelvin(900), kelvin(300)).inJoulesPerKelvin(), 1e-9);
        // With 50 K to drive the heat on either side, the loss is T0 Sgen.
        final var generated = carnot.entropyGenerationBetween(kelvin(950), kelvin(250));
        final double heatIn = R * 900 * Math.log(3);
        assertClose(heatIn / 3 / 250 - heatIn / 950, generated.inJoulesPerKelvin());
        assertClose(
                288.15 * generated.si(), GouyStodola.lostWork(generated, SITE).si());
    }

    /** The same between saturated liquid and vapour of water: isothermal, and isobaric as well. */
    @Test
    void carnotCycleOfWater() {
        final Fluid water = Water.industrial();
        final ProcessCycle carnot = ClosedMass.of(water, kilograms(1))
                .startingAt(water.state(celsius(200), Ratio.fraction(0)))
                .isothermalTo(Ratio.fraction(1))
                .isentropicTo(celsius(40))
                .isothermalTo(isentropicPartner(water))
                .closedBy(ProcessKind.ISENTROPIC);
        // IF97 fits each region and the saturation line on their own; across the dome q = Δh and T Δs differ by 1e-5.
        assertEquals(
                Carnot.engineEfficiency(celsius(200), celsius(40)).si(),
                carnot.thermalEfficiency().si(),
                1e-5);
        assertEquals(
                carnot.netWork().si(),
                carnot.netHeat().si(),
                1e-9 * carnot.heatIn().si());
        assertEquals(
                carnot.netWork().si(),
                carnot.temperatureEntropyArea().si(),
                1e-5 * carnot.heatIn().si());
    }

    /** {@return the volume at 40 °C that has the entropy of saturated liquid at 200 °C} */
    private static SpecificVolume isentropicPartner(Fluid water) {
        final FluidState liquid = water.state(celsius(200), Ratio.fraction(0));
        return water.state(celsius(40), liquid.entropy()).volume();
    }

    /** η = 1 − r^(1−k). */
    @Test
    void ottoCycleOfPerfectGas() {
        for (double r : new double[] {2, 8, 12, 25}) {
            final ProcessCycle otto = gas(1).isentropicTo(compressionRatio(r))
                    .isochoricAdding(kilojoulesPerKilogram(900))
                    .isentropicTo(expansionRatio(r))
                    .closedBy(ProcessKind.ISOCHORIC);
            assertClose(1 - Math.pow(r, 1 - K), otto.thermalEfficiency().si());
        }
    }

    /** η = 1 − r^(1−k) (c^k − 1)/(k (c − 1)) with the cut-off ratio c. */
    @Test
    void dieselCycleOfPerfectGas() {
        for (double cutOff : new double[] {1.5, 2, 3}) {
            final double r = 18;
            final ProcessCycle diesel = gas(1).isentropicTo(compressionRatio(r))
                    .isobaricTo(expansionRatio(cutOff))
                    .isentropicTo(expansionRatio(r / cutOff))
                    .closedBy(ProcessKind.ISOCHORIC);
            assertClose(
                    1 - Math.pow(r, 1 - K) * (Math.pow(cutOff, K) - 1) / (K * (cutOff - 1)),
                    diesel.thermalEfficiency().si());
        }
    }

    /** With an ideal regenerator the Stirling cycle has the efficiency of Carnot, without one much less. */
    @Test
    void stirlingCycle() {
        for (Fluid fluid : List.of(GAS, DryAir.standard())) {
            final ProcessCycle plain = ClosedMass.of(fluid, kilograms(0.01))
                    .startingAt(kelvin(300), bar(2))
                    .isothermalTo(compressionRatio(4))
                    .isochoricTo(kelvin(900))
                    .isothermalTo(expansionRatio(4))
                    .closedBy(ProcessKind.ISOCHORIC);
            final List<ProcessStep> steps = plain.steps();
            final ProcessCycle stirling = plain.withRegenerator(steps.get(3), steps.get(1));
            assertEquals(1 - 300.0 / 900, stirling.thermalEfficiency().si(), 1e-10);
            assertEquals(
                    steps.get(1).heat().si(),
                    stirling.regeneratedHeat().si(),
                    1e-9 * plain.heatIn().si());
            assertEquals(
                    0,
                    stirling.entropyGenerationBetween(kelvin(900), kelvin(300)).si(),
                    1e-9 * plain.heatIn().si() / 300);
        }
        final double r = 4;
        final double withoutRegenerator = R * 600 * Math.log(r) / (R * 900 * Math.log(r) + CV * 600); // W/(q34 + q23)
        final ProcessCycle plain = gas(1).isothermalTo(compressionRatio(r))
                .isochoricTo(kelvin(900))
                .isothermalTo(expansionRatio(r))
                .closedBy(ProcessKind.ISOCHORIC);
        assertClose(withoutRegenerator, plain.thermalEfficiency().si());
    }

    @Test
    void regeneratorDoesNotLiftHeat() {
        final ProcessCycle otto = gas(1).isentropicTo(compressionRatio(8))
                .isochoricTo(kelvin(1800))
                .isentropicTo(expansionRatio(8))
                .closedBy(ProcessKind.ISOCHORIC);
        final List<ProcessStep> steps = otto.steps();
        final ProcessException refusal =
                assertThrows(ProcessException.class, () -> otto.withRegenerator(steps.get(3), steps.get(1)));
        assertEquals(Reason.HEAT_UPHILL, refusal.reason());
        assertEquals(
                Reason.DIRECTION,
                assertThrows(ProcessException.class, () -> otto.withRegenerator(steps.get(1), steps.get(3)))
                        .reason());
    }

    /** A reversed Carnot cycle: COP Tc/(Th − Tc) and Th/(Th − Tc). */
    @Test
    void reversedCycleIsRefrigeratorAndHeatPump() {
        final ProcessCycle reversed = gas(1).isothermalTo(expansionRatio(2))
                .isentropicTo(kelvin(330))
                .isothermalTo(isentropicVolume(300, 330))
                .closedBy(ProcessKind.ISENTROPIC);
        assertClose(300.0 / 30, reversed.refrigeratorCop().si());
        assertClose(330.0 / 30, reversed.heatPumpCop().si());
        assertEquals(
                Reason.DIRECTION,
                assertThrows(ProcessException.class, reversed::thermalEfficiency)
                        .reason());
    }

    /** {@return the volume at {@code end} K on the isentrope through {@code start} K, 1 bar} */
    private static SpecificVolume isentropicVolume(double start, double end) {
        return SpecificVolume.cubicMetresPerKilogram(R * start / 1e5 * Math.pow(start / end, 1 / (K - 1)));
    }

    /** A single expansion does more work than the cycle that returns; what it used up is the exergy of the mass. */
    @Test
    void oneWayExpansionDoesMoreWorkThanTheCycle() {
        // The example of the package page, with its figures.
        final ClosedMass steam = ClosedMass.of(Water.industrial(), kilograms(0.2));
        final ProcessChain expansion = steam.startingAt(celsius(300), bar(10)).isentropicTo(bar(1.2));
        final ProcessCycle cycle = expansion.isobaricTo(Ratio.fraction(0.3)).closedBy(ProcessKind.POLYTROPIC);
        assertEquals(68.5, expansion.netWork().inKilojoules(), 0.05);
        assertEquals(32.5, cycle.netWork().inKilojoules(), 0.05);
        assertEquals(45.9, expansion.usefulWork(SITE).inKilojoules(), 0.05);
        assertFalse(expansion.closes());
        assertTrue(expansion.netWork().si() > cycle.netWork().si());
        assertTrue(expansion.exergyChange(SITE).si() < 0);
        assertEquals(0, cycle.chain().exergyChange(SITE).si(), 1e-6);
        // Reversible and adiabatic: the useful work is exactly the exergy used up.
        assertEquals(
                -expansion.exergyChange(SITE).si(), expansion.usefulWork(SITE).si(), 1e-6);
        assertEquals(
                expansion.netWork().si() - expansion.surroundingsWork(bar(1)).si(),
                expansion.usefulWork(SITE).si(),
                1e-9);
        assertEquals(0, cycle.chain().surroundingsWork(bar(1)).si(), 1e-9);
    }

    /** Heat taken from the environment at its temperature brings no exergy: useful work is the exergy used up. */
    @Test
    void isothermalExpansionAtAmbientTemperatureUsesUpItsExergy() {
        final ProcessChain vessel = ClosedMass.of(DryAir.standard(), kilograms(3))
                .startingAt(celsius(15), bar(200))
                .isothermalTo(bar(1));
        assertClose(-vessel.exergyChange(SITE).si(), vessel.usefulWork(SITE).si());
        assertEquals(0, vessel.lastStep().entropyGenerationWith(celsius(15)).si(), 1e-8);
        final double heat = vessel.lastStep().heat().si();
        assertEquals(
                heat / 288.15 - heat / 313.15,
                vessel.lastStep().entropyGenerationWith(celsius(40)).si(),
                1e-9 * heat);
    }

    /** Boiling at constant pressure is boiling at constant temperature: w = p Δv, q = Δh. */
    @Test
    void isothermFromLiquidToVapourPassesTheDome() {
        final Fluid water = Water.industrial();
        final ProcessChain chain = ClosedMass.of(water, kilograms(1))
                .startingAt(celsius(150), bar(20))
                .isothermalTo(bar(1));
        final ProcessStep step = chain.lastStep();
        assertEquals(Phase.LIQUID, step.from().phase());
        assertEquals(Phase.VAPOUR, step.to().phase());
        final var saturation = water.saturation(celsius(150));
        final double dome =
                saturation.pressure().si() * saturation.volumeOfEvaporation().si();
        final ClosedMass kilogram = ClosedMass.of(water, kilograms(1));
        final double liquid = kilogram.startingAt(celsius(150), bar(20))
                .isothermalTo(saturation.liquid().volume())
                .netWork()
                .si();
        final double vapour = kilogram.startingAt(saturation.vapour())
                .isothermalTo(bar(1))
                .netWork()
                .si();
        assertClose(liquid + dome + vapour, step.work().si());
        final List<FluidState> path = step.path(30);
        assertTrue(path.size() >= 30);
        assertEquals(step.from(), path.get(0));
        assertEquals(step.to(), path.get(path.size() - 1));
        assertTrue(path.contains(saturation.liquid()) && path.contains(saturation.vapour()));
        assertTrue(path.stream().anyMatch(s -> s.phase() == Phase.TWO_PHASE));
        assertEquals(
                chain.end().volume().si(),
                kilogram.startingAt(celsius(150), bar(20))
                        .isothermalAdding(step.specificHeat())
                        .end()
                        .volume()
                        .si(),
                1e-6 * chain.end().volume().si());
    }

    /** By Maxwell's equal areas, the work of the isotherm through the dome is that of the equation of state itself. */
    @Test
    void isothermThroughTheDomeDoesTheWorkOfMaxwell() {
        final Fluid fluid = Fluid.of(new VanDerWaalsFluid());
        for (double kelvin : new double[] {200, 250, 290, 303, 320}) {
            final ProcessStep step = ClosedMass.of(fluid, kilograms(1))
                    .startingAt(kelvin(kelvin), bar(150))
                    .isothermalTo(bar(1))
                    .lastStep();
            final double work = VanDerWaalsFluid.isothermalWork(
                    kelvin, step.from().volume().si(), step.to().volume().si());
            assertEquals(work, step.work().si(), 1e-10 * work);
            final double heat = kelvin * step.entropyChange().si();
            assertEquals(heat, step.heat().si(), 1e-10 * heat);
        }
    }

    /** Carnot's efficiency does not depend on the fluid: here it boils at 290 K and condenses at 220 K. */
    @Test
    void carnotCycleThroughTheDome() {
        final Fluid fluid = Fluid.of(new VanDerWaalsFluid());
        final FluidState liquid = fluid.state(kelvin(290), Ratio.fraction(0));
        final ProcessCycle carnot = ClosedMass.of(fluid, kilograms(1))
                .startingAt(liquid)
                .isothermalTo(Ratio.fraction(1))
                .isentropicTo(kelvin(220))
                .isothermalTo(fluid.state(kelvin(220), liquid.entropy()).volume())
                .closedBy(ProcessKind.ISENTROPIC);
        assertEquals(1 - 220.0 / 290, carnot.thermalEfficiency().si(), 1e-10);
        assertEquals(
                carnot.netWork().si(),
                carnot.pressureVolumeArea().si(),
                1e-8 * carnot.netWork().si());
    }

    /** From liquid under pressure to wet steam a polytrope takes heat in, then gives heat off. */
    @Test
    void polytropeThatTurnsCountsItsHeatInParts() {
        final Fluid water = Water.industrial();
        final ProcessStep step = ClosedMass.of(water, kilograms(1))
                .startingAt(celsius(175), bar(280))
                .polytropicTo(water.state(bar(1.2), Ratio.fraction(0.08)))
                .lastStep();
        double in = 0;
        double out = 0;
        final List<FluidState> path = step.path(20_001);
        for (int i = 1; i < path.size(); i++) {
            final FluidState a = path.get(i - 1);
            final FluidState b = path.get(i);
            final double heat = 0.5
                    * (a.temperature().si() + b.temperature().si())
                    * (b.entropy().si() - a.entropy().si());
            in += Math.max(0, heat);
            out += Math.max(0, -heat);
        }
        assertTrue(step.heatIn().si() > 5e5 && step.heatOut().si() > 5e5, step::toString);
        // Across the saturation line of IF97 the two counts differ by its fitting error, some 1e-5.
        assertEquals(in, step.heatIn().si(), 2e-5 * in);
        assertEquals(out, step.heatOut().si(), 2e-5 * out);
        assertEquals(step.heat().si(), step.heatIn().si() - step.heatOut().si(), 1e-6);
        final ProcessStep gasStep = gas(1).polytropicTo(bar(9), 1.2).lastStep();
        assertEquals(0, gasStep.heatIn().si());
        assertClose(-gasStep.heat().si(), gasStep.heatOut().si());
    }

    @Test
    void polytropeOfSteamFindsItsEndTemperature() {
        final ProcessChain steam =
                ClosedMass.of(Water.industrial(), kilograms(1)).startingAt(celsius(400), bar(40));
        final ProcessStep step = steam.polytropicTo(celsius(200), 1.28).lastStep();
        assertEquals(200, step.to().temperature().inCelsius(), 1e-8);
        assertEquals(
                40e5 * Math.pow(step.from().volume().si(), 1.28),
                step.to().pressure().si() * Math.pow(step.to().volume().si(), 1.28),
                1e-6);
    }

    /** The areas of the four worked cycles against their own net work, not against the sum of all terms. */
    @Test
    void workedCyclesEncloseTheirNetWork() {
        final ClosedMass air = ClosedMass.of(DryAir.standard(), kilograms(1));
        final ProcessChain start = air.startingAt(kelvin(300), bar(1));
        final ProcessCycle otto = start.isentropicTo(compressionRatio(9))
                .isochoricTo(kelvin(2000))
                .isentropicTo(expansionRatio(9))
                .closedBy(ProcessKind.ISOCHORIC);
        final ProcessCycle diesel = start.isentropicTo(compressionRatio(20))
                .isobaricTo(expansionRatio(2))
                .isentropicTo(expansionRatio(10))
                .closedBy(ProcessKind.ISOCHORIC);
        final ProcessCycle stirling = start.isothermalTo(compressionRatio(5))
                .isochoricTo(kelvin(1000))
                .isothermalTo(expansionRatio(5))
                .closedBy(ProcessKind.ISOCHORIC);
        final FluidState hot = DryAir.standard().state(kelvin(900), bar(40));
        final ProcessCycle carnot = air.startingAt(hot)
                .isothermalTo(expansionRatio(2))
                .isentropicTo(kelvin(300))
                .isothermalTo(
                        DryAir.standard().state(kelvin(300), hot.entropy()).volume())
                .closedBy(ProcessKind.ISENTROPIC);
        for (ProcessCycle cycle : List.of(otto, diesel, stirling, carnot)) {
            final double work = cycle.netWork().si();
            assertEquals(work, cycle.netHeat().si(), 1e-11 * work);
            assertEquals(work, cycle.pressureVolumeArea().si(), 1e-8 * work);
            assertEquals(work, cycle.temperatureEntropyArea().si(), 1e-8 * work);
        }
        assertEquals(1 - 300.0 / 900, carnot.thermalEfficiency().si(), 1e-10);
        assertTrue(otto.hottest().si() >= 2000 * (1 - 1e-12) && otto.coldest().si() <= 300 * (1 + 1e-12));
    }

    @Test
    void pathOfIsentropeHasItsCornerAtSaturation() {
        final Fluid water = Water.industrial();
        final List<FluidState> path = ClosedMass.of(water, kilograms(1))
                .startingAt(celsius(300), bar(10))
                .isentropicTo(bar(0.1))
                .lastStep()
                .path(9);
        final double corner = path.stream()
                .filter(s -> s.phase() != Phase.TWO_PHASE)
                .mapToDouble(s -> s.temperature().si()
                        - water.saturation(s.pressure()).temperature().si())
                .min()
                .orElseThrow();
        assertEquals(0, corner, 1e-6);
        assertTrue(path.size() >= 9);
        assertThrows(
                IllegalArgumentException.class,
                () -> gas(1).isentropicTo(bar(2)).lastStep().path(1));
    }

    @Test
    void pressureOnTheSaturationLineIsNoEnd() {
        final Fluid water = Water.industrial();
        final ProcessChain wet =
                ClosedMass.of(water, kilograms(1)).startingAt(water.state(bar(5), Ratio.fraction(0.4)));
        final ProcessException pressure = assertThrows(
                ProcessException.class, () -> wet.isothermalTo(wet.start().pressure()));
        assertEquals(Reason.END_NOT_DETERMINED, pressure.reason());
        assertTrue(pressure.getMessage().contains("give the vapour fraction"), pressure.getMessage());
        final ProcessException temperature = assertThrows(
                ProcessException.class, () -> wet.isobaricTo(wet.start().temperature()));
        assertEquals(Reason.END_NOT_DETERMINED, temperature.reason());
    }

    @Test
    void ratiosAreAboveOne() {
        for (double wrong : new double[] {1, 0.5, 0, -3, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThrows(OutOfRangeException.class, () -> compressionRatio(wrong));
            assertThrows(OutOfRangeException.class, () -> expansionRatio(wrong));
            assertThrows(OutOfRangeException.class, () -> raisedByFactor(wrong));
            assertThrows(OutOfRangeException.class, () -> loweredByFactor(wrong));
        }
        final String message = assertThrows(OutOfRangeException.class, () -> compressionRatio(0.125))
                .getMessage();
        assertTrue(message.contains("compression ratio") && message.contains("0.125"), message);
        assertThrows(OutOfRangeException.class, () -> ClosedMass.of(GAS, kilograms(0)));
    }

    @Test
    void impossibleEndsNameTheStep() {
        final ProcessChain water =
                ClosedMass.of(Water.industrial(), kilograms(1)).startingAt(celsius(20), bar(1));
        final ProcessException refusal = assertThrows(
                ProcessException.class,
                () -> water.isobaricTo(celsius(60)).isobaricTo(SpecificVolume.cubicMetresPerKilogram(1e-4)));
        assertEquals(Reason.END_NOT_REACHED, refusal.reason());
        assertTrue(refusal.getMessage().startsWith("step 2, isobaric from 60 °C"), refusal.getMessage());
        assertTrue(refusal.getCause() instanceof OutOfRangeException, String.valueOf(refusal.getCause()));
        assertEquals(
                Reason.EXPONENT,
                assertThrows(ProcessException.class, () -> gas(1).polytropicTo(bar(2), Double.NaN))
                        .reason());
        assertEquals(
                Reason.EXPONENT,
                assertThrows(ProcessException.class, () -> gas(1).polytropicTo(bar(2), 0))
                        .reason());
        assertEquals(
                Reason.EXPONENT,
                assertThrows(ProcessException.class, () -> gas(1).polytropicTo(kelvin(400), 1))
                        .reason());
        assertEquals(
                Reason.OTHER_FLUID,
                assertThrows(
                                ProcessException.class,
                                () -> ClosedMass.of(GAS, kilograms(1))
                                        .startingAt(Water.industrial().state(celsius(20), bar(1))))
                        .reason());
    }

    @Test
    void openChainTellsItsGap() {
        final ProcessChain open = gas(1).isentropicTo(compressionRatio(8)).isochoricTo(kelvin(1500));
        final OpenChainException gap = assertThrows(OpenChainException.class, open::closed);
        assertEquals(1200, gap.temperatureGap().inKelvins(), 1e-9);
        assertTrue(gap.getMessage().contains("does not close"), gap.getMessage());
        final OpenChainException isochore =
                assertThrows(OpenChainException.class, () -> open.closedBy(ProcessKind.ISOCHORIC));
        assertTrue(isochore.getMessage().contains("the isochoric path"), isochore.getMessage());
        assertTrue(open.relativeGap().si() > 3);
        assertThrows(OpenChainException.class, () -> gas(1).closed());
    }

    @Test
    void heatDoesNotFlowUphill() {
        final ProcessStep heated = gas(1).isochoricTo(kelvin(700)).lastStep();
        assertTrue(heated.entropyGenerationWith(kelvin(700)).si() > 0);
        final ProcessException refusal =
                assertThrows(ProcessException.class, () -> heated.entropyGenerationWith(kelvin(650)));
        assertEquals(Reason.HEAT_UPHILL, refusal.reason());
        assertTrue(refusal.getMessage().contains("hotter reservoir"), refusal.getMessage());
    }

    @Test
    void printsStatesStepsAndFigures() {
        final String text = gas(1).isentropicTo(compressionRatio(8))
                .isochoricTo(kelvin(1800))
                .polytropicTo(expansionRatio(8), 1.3)
                .closedBy(ProcessKind.ISOCHORIC)
                .toString();
        assertTrue(text.contains("1 kg air"), text);
        assertTrue(text.contains("polytropic, n = 1.3"), text);
        assertTrue(text.contains("thermal efficiency"), text);
        assertTrue(text.contains("net"), text);
    }
}
