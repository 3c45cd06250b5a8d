package lostwork.exergy;

import static lostwork.quantity.Energy.kilojoules;
import static lostwork.quantity.Power.watts;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.SpecificEnergy.kilojoulesPerKilogram;
import static lostwork.quantity.Speed.metresPerSecond;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.SpecificEnergy;
import lostwork.testing.PrintedValue;
import org.junit.jupiter.api.Test;

/**
 * Worked examples of textbooks. Printed answers and printed property values are from memory; every answer follows from its
 * inputs by hand. Tolerance: half a unit of the last printed digit.
 */
class WorkedExamplesTableTest {
    /** Y. A. Çengel, M. A. Boles, Thermodynamics, an Engineering Approach, chapter 8: cooling of an iron block. */
    @Test
    void ironBlock() {
        final var environment = ReferenceEnvironment.of(kelvin(300), bar(1));
        final double heat = 500 * 0.45 * (473 - 300);
        PrintedValue.of("38925").assertMatches(heat, "heat released, kJ");
        PrintedValue.of("8191")
                .assertMatches(
                        environment
                                .heatExergy(kilojoules(heat), TemperatureGlide.between(kelvin(473), kelvin(300)))
                                .inKilojoules(),
                        "reversible work, kJ");
    }

    /** Çengel and Boles, chapter 8: heat through a brick wall, the wall alone and with the air on both sides. */
    @Test
    void brickWall() {
        final var outdoors = ReferenceEnvironment.of(kelvin(273), bar(1));
        final var wall = EntropyBalance.empty().heatIn(watts(1035), kelvin(293)).heatOut(watts(1035), kelvin(278));
        PrintedValue.of("52.0")
                .assertMatches(
                        GouyStodola.lostPower(wall.generation(), outdoors).inWatts(), "wall, W");
        final var extended =
                EntropyBalance.empty().heatIn(watts(1035), kelvin(300)).heatOut(watts(1035), kelvin(273));
        PrintedValue.of("93.2")
                .assertMatches(
                        GouyStodola.lostPower(extended.generation(), outdoors).inWatts(), "extended system, W");
        // The same from the other book: exergy of the heat on both sides.
        PrintedValue.of("52.0")
                .assertMatches(
                        outdoors.heatExergy(watts(1035), kelvin(293)).inWatts()
                                - outdoors.heatExergy(watts(1035), kelvin(278)).inWatts(),
                        "wall by exergies, W");
    }

    /** Çengel and Boles, chapter 8: R-134a from 0.14 MPa, -10 °C to 0.8 MPa, 50 °C, environment 20 °C (taken as 293 K). */
    @Test
    void refrigerantCompression() {
        final var environment = ReferenceEnvironment.of(kelvin(293), bar(0.95));
        final var dead = new TabulatedState.TabulatedDead(0, 0); // drops out of a difference
        final var inlet = new TabulatedState(246.36, 0.9724, 263, 1.4, dead);
        final var outlet = new TabulatedState(286.69, 0.9802, 323, 8, dead);
        PrintedValue.of("38.0")
                .assertMatches(
                        environment
                                .flowExergy(outlet)
                                .minus(environment.flowExergy(inlet))
                                .inKilojoulesPerKilogram(),
                        "increase of flow exergy, kJ/kg");
    }

    private static final TabulatedState.TabulatedDead WATER_AT_25_CELSIUS =
            new TabulatedState.TabulatedDead(104.89, 0.3674);

    /** M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, example 7.5: steam through a throttle. */
    @Test
    void steamThrottle() {
        final var environment = ReferenceEnvironment.of(kelvin(298), bar(1));
        final var inlet = new TabulatedState(3043.4, 6.6245, 593, 30, WATER_AT_25_CELSIUS);
        final var outlet = new TabulatedState(3043.4, 7.4223, 557, 5, WATER_AT_25_CELSIUS);
        final SpecificEnergy before = environment.flowExergy(inlet);
        final SpecificEnergy after = environment.flowExergy(outlet);
        PrintedValue.of("1073.89").assertMatches(before.inKilojoulesPerKilogram(), "inlet, kJ/kg");
        PrintedValue.of("836.15").assertMatches(after.inKilojoulesPerKilogram(), "outlet, kJ/kg");
        PrintedValue.of("237.7")
                .assertMatches(before.minus(after).inKilojoulesPerKilogram(), "destruction by exergies, kJ/kg");
        PrintedValue.of("237.7")
                .assertMatches(
                        GouyStodola.lostWork(outlet.entropy().minus(inlet.entropy()), environment)
                                .inKilojoulesPerKilogram(),
                        "destruction by entropy, kJ/kg");
    }

    /** Moran and Shapiro, example 7.7: steam turbine with heat loss at 350 K and kinetic energy. */
    @Test
    void steamTurbineWithHeatLoss() {
        final var environment = ReferenceEnvironment.of(kelvin(298), bar(1));
        final var inlet = new TabulatedState(3230.9, 6.9212, 673, 30, WATER_AT_25_CELSIUS);
        final var outlet = new TabulatedState(2676.1, 7.3549, 373, 1.014, WATER_AT_25_CELSIUS);
        final SpecificEnergy work = kilojoulesPerKilogram(540);
        final SpecificEnergy kineticIn = environment.kineticExergy(metresPerSecond(160));
        final SpecificEnergy kineticOut = environment.kineticExergy(metresPerSecond(100));
        final SpecificEnergy heat = work.plus(outlet.enthalpy())
                .minus(inlet.enthalpy())
                .plus(kineticOut)
                .minus(kineticIn);
        PrintedValue.of("-22.6").assertMatches(heat.inKilojoulesPerKilogram(), "heat, kJ/kg");
        final SpecificEnergy drop = environment
                .flowExergy(inlet)
                .plus(kineticIn)
                .minus(environment.flowExergy(outlet))
                .minus(kineticOut);
        PrintedValue.of("691.84").assertMatches(drop.inKilojoulesPerKilogram(), "drop of flow exergy, kJ/kg");
        final SpecificEnergy withHeat = environment.heatExergy(heat, kelvin(350));
        PrintedValue.of("-3.36").assertMatches(withHeat.inKilojoulesPerKilogram(), "exergy with heat, kJ/kg");
        PrintedValue.of("148.48")
                .assertMatches(withHeat.minus(work).plus(drop).inKilojoulesPerKilogram(), "exergy destruction, kJ/kg");
    }

    /**
     * F. L. Curzon, B. Ahlborn, American Journal of Physics 43 (1975) 22-24, table of plants. Printed Carnot values of the
     * coal (64.1) and geothermal plant (32.3) and the endoreversible value of the latter (17.5) do not follow from the
     * printed temperatures; those three are left out. For the coal plant another published page gives 64.4 and 40.4.
     */
    @Test
    void plantsOfCurzonAndAhlborn() {
        PrintedValue.of("64.4")
                .assertMatches(
                        Carnot.engineEfficiency(celsius(565), celsius(25)).inPercent(), "Carnot, coal");
        PrintedValue.of("40")
                .assertMatches(
                        CurzonAhlborn.engineEfficiency(celsius(565), celsius(25))
                                .inPercent(),
                        "coal");
        PrintedValue.of("40.4")
                .assertMatches(
                        CurzonAhlborn.engineEfficiency(celsius(565), celsius(25))
                                .inPercent(),
                        "coal");
        PrintedValue.of("48.0")
                .assertMatches(
                        Carnot.engineEfficiency(celsius(300), celsius(25)).inPercent(), "Carnot, nuclear");
        PrintedValue.of("28")
                .assertMatches(
                        CurzonAhlborn.engineEfficiency(celsius(300), celsius(25))
                                .inPercent(),
                        "nuclear");
    }

    /** The same table, observed efficiencies over Carnot's: what large plants really reach, about half to 0.63. */
    @Test
    void observedPlantsLieNearTheEndoreversibleEfficiency() {
        final double[][] plants = {{565, 25, 36}, {300, 25, 30}, {250, 80, 16}};
        for (final double[] plant : plants) {
            final double observed = plant[2] / 100;
            final double carnot = Carnot.engineEfficiency(celsius(plant[0]), celsius(plant[1]))
                    .inFraction();
            final double endoreversible = CurzonAhlborn.engineEfficiency(celsius(plant[0]), celsius(plant[1]))
                    .inFraction();
            assertTrue(
                    observed / carnot > 0.49 && observed / carnot < 0.64, () -> "share of Carnot " + observed / carnot);
            assertTrue(Math.abs(observed - endoreversible) < 0.2 * carnot, () -> observed + " by " + endoreversible);
        }
    }

    /** R. Petela, Journal of Heat Transfer 86 (1964) 187: solar radiation as a black body at 6000 K, environment 300 K. */
    @Test
    void solarRadiation() {
        final var environment = ReferenceEnvironment.of(kelvin(300), bar(1));
        PrintedValue.of("0.9333")
                .assertMatches(environment.radiationFactor(kelvin(6000)).inFraction(), "6000 K against 300 K");
    }
}
