package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.kilopascal;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.gas.DryAir;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;

/**
 * Air-standard gas-turbine cycles with variable heat capacity, and one with constant heat capacity.
 *
 * <p>Sources: Çengel, Boles, Thermodynamics: An Engineering Approach, chapter 9, examples 9-5 and 9-6 and problem 9-134;
 * Moran, Shapiro, Fundamentals of Engineering Thermodynamics, chapter 9, example 9.4. The examples from memory, the problem
 * from its published solution.
 *
 * <p>Tolerances: half a unit of the last printed digit, and beside it what the air table of the books costs. They
 * interpolate linearly in a table of relative pressures with three or four digits, of which a unit moves a temperature by
 * up to 1 K at 540 K and a specific work by up to 0.5 kJ/kg; each check states the room it takes.
 */
class GasTurbineTableTest {
    private final Compressor compressor = new Compressor("compressor");
    private final Heater burner = new Heater("burner");
    private final Turbine turbine = new Turbine("turbine");
    private final Cooler cooler = new Cooler("cooler");

    private Solution cycle(double ratio, double hottest, double compression, double expansion, double flow) {
        final var b = Plant.builder("gas turbine");
        b.add(compressor);
        b.add(burner);
        b.add(turbine);
        b.add(cooler);
        b.circuit(DryAir.standard(), compressor, burner, turbine, cooler);
        return b.build()
                .specify()
                .given(compressor.inlet().pressure(), kilopascal(100))
                .given(compressor.inlet().temperature(), kelvin(300))
                .given(compressor.pressureRatio(), Ratio.fraction(ratio))
                .given(turbine.inlet().temperature(), kelvin(hottest))
                .given(compressor.isentropicEfficiency(), Ratio.fraction(compression))
                .given(turbine.isentropicEfficiency(), Ratio.fraction(expansion))
                .given(compressor.inlet().flow(), kilogramsPerSecond(flow))
                .solve();
    }

    private double backWorkRatio(Solution s) {
        return s.value(compressor.power()).inWatts() / s.value(turbine.power()).inWatts();
    }

    private double efficiencyInPercent(Solution s) {
        return 100 * net(s).inWatts() / s.value(burner.duty()).inWatts();
    }

    private Power net(Solution s) {
        return s.value(turbine.power()).minus(s.value(compressor.power()));
    }

    @Test
    void cengelExample9Point5() {
        final Solution s = cycle(8, 1300, 1, 1, 1);
        BookValue.of("540")
                .assertMatches(s.value(compressor.outlet().temperature()).inKelvin(), 0.5, "compressor outlet in K");
        BookValue.of("770")
                .assertMatches(s.value(turbine.outlet().temperature()).inKelvin(), "turbine outlet in K");
        BookValue.of("0.403").assertMatches(backWorkRatio(s), 0.0005, "back work ratio");
        BookValue.of("42.6").assertMatches(efficiencyInPercent(s), 0.05, "thermal efficiency in %");
    }

    @Test
    void cengelExample9Point6() {
        final Solution s = cycle(8, 1300, 0.80, 0.85, 1);
        BookValue.of("853")
                .assertMatches(s.value(turbine.outlet().temperature()).inKelvin(), "turbine outlet in K");
        BookValue.of("0.592").assertMatches(backWorkRatio(s), "back work ratio");
        BookValue.of("26.6").assertMatches(efficiencyInPercent(s), "thermal efficiency in %");
    }

    /** 5 m³/s at the inlet is 5.807 kg/s with R = 0.287 kJ/(kg K). */
    @Test
    void moranShapiroExample9Point4() {
        final Solution s = cycle(10, 1400, 1, 1, 100e3 * 5 / (287.0 * 300));
        BookValue.of("45.7").assertMatches(efficiencyInPercent(s), 0.05, "thermal efficiency in %");
        BookValue.of("39.6").assertMatches(100 * backWorkRatio(s), "back work ratio in %");
        BookValue.of("2481").assertMatches(net(s).inKilowatts(), 5.8 * 0.5, "net power in kW");
    }

    /** The cycle of example 9.4 with a regenerator of 80 %, example 9.7 (from memory). */
    @Test
    void moranShapiroExample9Point7() {
        final var regenerator = new HeatExchanger("regenerator");
        final var b = Plant.builder("regenerative gas turbine");
        b.add(compressor);
        b.add(regenerator);
        b.add(burner);
        b.add(turbine);
        b.add(cooler);
        b.circuit(
                DryAir.standard(), compressor, regenerator.coldSide(), burner, turbine, regenerator.hotSide(), cooler);
        final Solution s = b.build()
                .specify()
                .given(compressor.inlet().pressure(), kilopascal(100))
                .given(compressor.inlet().temperature(), kelvin(300))
                .given(compressor.pressureRatio(), Ratio.fraction(10))
                .given(turbine.inlet().temperature(), kelvin(1400))
                .given(compressor.isentropicEfficiency(), Ratio.percent(100))
                .given(turbine.isentropicEfficiency(), Ratio.percent(100))
                .given(regenerator.effectiveness(), Ratio.percent(80))
                .given(compressor.inlet().flow(), kilogramsPerSecond(1))
                .solve();
        BookValue.of("56.8").assertMatches(efficiencyInPercent(s), "thermal efficiency in %");
    }

    /**
     * Three-stage compression from 290 K with intercooling, three turbines of 300 kJ/kg each, a regenerator whose cold air
     * leaves 20 K above the compressor outlet and whose gas leaves 20 K below the last turbine outlet; κ = 1.4,
     * cp = 1.005 kJ/(kg K). The regenerator is a heater and a cooler joined by heat.
     *
     * <p>The solution rounds every temperature to 0.1 K and goes on with it (450.9 + 298.5 = 749.4, 504.3 + 298.5 = 802.8,
     * 540.2 + 298.5 = 838.7), which adds up to 0.08 K at the third turbine; without rounding it is 838.78 K,
     * and the heat rejected is 0.1 kJ/kg more.
     */
    @Test
    void cengelProblem9Point134() {
        final var b = Plant.builder("three-stage gas turbine");
        final var compressors = new Compressor[3];
        final var coolers = new Cooler[3];
        final var heaters = new Heater[3];
        final var turbines = new Turbine[3];
        for (int i = 0; i < 3; i++) {
            compressors[i] = b.add(new Compressor("compressor " + i));
            coolers[i] = b.add(new Cooler("cooler " + i));
            heaters[i] = b.add(new Heater("heater " + i));
            turbines[i] = b.add(new Turbine("turbine " + i));
        }
        final var cold = b.add(new Heater("regenerator, air"));
        final var warm = b.add(new Cooler("regenerator, gas"));
        b.circuit(
                TestGas.COLD_AIR,
                compressors[0],
                coolers[0],
                compressors[1],
                coolers[1],
                compressors[2],
                cold,
                heaters[0],
                turbines[0],
                heaters[1],
                turbines[1],
                heaters[2],
                turbines[2],
                warm,
                coolers[2]);
        b.connect(warm.heat(), cold.heat());
        var given = b.build()
                .specify()
                .given(compressors[0].inlet().pressure(), kilopascal(100))
                .given(compressors[0].inlet().flow(), kilogramsPerSecond(1));
        for (int i = 0; i < 3; i++) {
            given = given.given(coolers[i].outlet().temperature(), kelvin(290))
                    .given(compressors[i].pressureRatio(), Ratio.fraction(4))
                    .given(compressors[i].isentropicEfficiency(), Ratio.percent(100))
                    .given(turbines[i].isentropicEfficiency(), Ratio.percent(100))
                    .given(heaters[i].duty(), Power.kilowatts(300));
            if (i < 2) {
                given = given.given(turbines[i].pressureRatio(), Ratio.fraction(4));
            }
        }
        final double compressed = 290 * Math.pow(4, 0.4 / 1.4);
        final Solution s = given.given(cold.outlet().temperature(), kelvin(compressed + 20))
                .solve();
        BookValue.of("430.9")
                .assertMatches(s.value(compressors[2].outlet().temperature()).inKelvin(), "compressor outlets in K");
        final String[] inlets = {"749.4", "802.8", "838.7"};
        for (int i = 0; i < 3; i++) {
            BookValue.of(inlets[i])
                    .assertMatches(
                            s.value(turbines[i].inlet().temperature()).inKelvin(),
                            0.02 * i,
                            "turbine inlet " + i + " in K");
        }
        final double last = s.value(turbines[2].outlet().temperature()).inKelvin();
        BookValue.of("564.4").assertMatches(last, 0.04, "last turbine outlet in K");
        assertEquals(last - 20, s.value(warm.outlet().temperature()).inKelvin(), 1e-9);
        double rejected = 0;
        for (Cooler cooler : coolers) {
            rejected += s.value(cooler.duty()).inKilowatts();
        }
        BookValue.of("538.9").assertMatches(rejected, 0.1, "heat rejected in kJ/kg");
        BookValue.of("40.1").assertMatches(100 * (900 - rejected) / 900, "thermal efficiency in %");
        assertEquals(0, s.closure().energy(), 1e-12);
    }
}
