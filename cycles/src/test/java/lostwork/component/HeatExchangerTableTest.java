package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.megapascal;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.Fluid;
import lostwork.fluid.gas.PerfectGas;
import lostwork.fluid.water.Water;
import lostwork.plant.Solution;
import lostwork.quantity.Conductance;
import lostwork.quantity.MolarMass;
import lostwork.quantity.SpecificHeatCapacity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Heat exchangers against published figures.
 *
 * <p>Tolerances: half a unit of the last printed digit. A perfect gas stands in for every stream of constant heat capacity.
 */
class HeatExchangerTableTest {
    private static Fluid stream(double joulesPerKilogramKelvin) {
        return PerfectGas.of(
                "stream of constant heat capacity",
                MolarMass.gramsPerMole(100),
                SpecificHeatCapacity.joulesPerKilogramKelvin(joulesPerKilogramKelvin));
    }

    /**
     * Source: Kays, London, Compact Heat Exchangers, tables of effectiveness; three digits, from memory. The capacity ratio
     * is 1 for the last four rows.
     */
    @ParameterizedTest
    @CsvSource({
        "1, 0.25, 0.598",
        "2, 0.25, 0.823",
        "1, 0.50, 0.565",
        "2, 0.50, 0.775",
        "1, 0.75, 0.532",
        "2, 0.75, 0.722",
        "1, 1.00, 0.500",
        "2, 1.00, 0.667",
        "3, 1.00, 0.750",
        "5, 1.00, 0.833",
    })
    void kaysLondonCounterflow(double transferUnits, double capacityRatio, double printed) {
        // The smaller capacity rate is 2 kW/K; once on the hot and once on the cold side.
        for (int smaller = 0; smaller < 2; smaller++) {
            final double hotRate = smaller == 0 ? 2 : 2 / capacityRatio;
            final double coldRate = smaller == 0 ? 2 / capacityRatio : 2;
            final var p = new TwoStreams(stream(1000), stream(1000), FlowArrangement.COUNTERFLOW);
            final Solution s = p.plant
                    .specify()
                    .given(p.hot.flow(), kilogramsPerSecond(hotRate))
                    .given(p.cold.flow(), kilogramsPerSecond(coldRate))
                    .given(p.hot.temperature(), celsius(300))
                    .given(p.cold.temperature(), celsius(20))
                    .given(p.hot.pressure(), bar(1))
                    .given(p.cold.pressure(), bar(1))
                    .given(p.exchanger.conductance(), Conductance.kilowattsPerKelvin(2 * transferUnits))
                    .solve();
            assertEquals(printed, s.value(p.exchanger.effectiveness()).si(), 0.0005);
        }
    }

    /**
     * Parallel flow: ε = (1 − exp(−NTU (1 + C)))/(1 + C).
     *
     * <p>Source: Incropera, DeWitt, Fundamentals of Heat and Mass Transfer, chapter on heat exchangers, table of
     * effectiveness relations; from memory.
     */
    @ParameterizedTest
    @CsvSource({"0.5, 0.2", "1, 0.5", "2, 0.7", "3, 1.0"})
    void incroperaParallelFlow(double transferUnits, double capacityRatio) {
        final var p = new TwoStreams(stream(1000), stream(1000), FlowArrangement.PARALLEL_FLOW);
        final Solution s = p.plant
                .specify()
                .given(p.hot.flow(), kilogramsPerSecond(2 / capacityRatio))
                .given(p.cold.flow(), kilogramsPerSecond(2))
                .given(p.hot.temperature(), celsius(300))
                .given(p.cold.temperature(), celsius(20))
                .given(p.hot.pressure(), bar(1))
                .given(p.cold.pressure(), bar(1))
                .given(p.exchanger.conductance(), Conductance.kilowattsPerKelvin(2 * transferUnits))
                .solve();
        final double expected = (1 - Math.exp(-transferUnits * (1 + capacityRatio))) / (1 + capacityRatio);
        assertEquals(expected, s.value(p.exchanger.effectiveness()).si(), 1e-9);
    }

    /**
     * Concentric-tube oil cooler: oil 0.1 kg/s from 100 °C to 60 °C with cp = 2131 J/(kg K), water 0.2 kg/s from 30 °C with
     * cp = 4178 J/(kg K).
     *
     * <p>Source: Incropera, DeWitt, Fundamentals of Heat and Mass Transfer, chapter on heat exchangers, first example; from
     * memory.
     */
    @Test
    void incroperaOilCooler() {
        final var p = new TwoStreams(stream(2131), stream(4178), FlowArrangement.COUNTERFLOW);
        final Solution s = p.plant
                .specify()
                .given(p.hot.flow(), kilogramsPerSecond(0.1))
                .given(p.cold.flow(), kilogramsPerSecond(0.2))
                .given(p.hot.temperature(), celsius(100))
                .given(p.hotEnd.temperature(), celsius(60))
                .given(p.cold.temperature(), celsius(30))
                .given(p.hot.pressure(), bar(1))
                .given(p.cold.pressure(), bar(1))
                .solve();
        assertEquals(8524, s.value(p.exchanger.duty()).inWatts(), 0.5);
        assertEquals(40.2, s.value(p.coldEnd.temperature()).inCelsius(), 0.05);
        assertEquals(43.2, s.value(p.exchanger.meanDifference()).inKelvins(), 0.05);
        assertEquals(
                8524 / 43.2, s.value(p.exchanger.conductance()).inWattsPerKelvin(), 0.5 * 8524 / 43.2 * (0.1 / 43.2));
    }

    /**
     * A waste-heat boiler by hand: 50 kg/s of gas with cp = 1.1 kJ/(kg K) at 520 °C; steam of 5 MPa and 400 °C from water of
     * 100 °C; 15 K at the pinch, where the water begins to boil.
     *
     * <p>Source of the properties: Çengel, Boles, Thermodynamics, tables, from memory: at 5 MPa
     * T<sub>sat</sub> = 263.94 °C, h<sub>f</sub> = 1154.5 kJ/kg, h(400 °C) = 3196.7 kJ/kg, h(100 °C) = 422.85 kJ/kg. By hand:
     * 55 kW/K × (520 − 278.94) K = 13,258 kW above the pinch; 13,258/(3196.7 − 1154.5) = 6.492 kg/s; 6.492 × (3196.7 −
     * 422.85) = 18,008 kW; 520 − 18,008/55 = 192.6 °C. The figures are rounded to what the tables carry.
     */
    @Test
    void wasteHeatBoilerByHand() {
        final var p = new TwoStreams(stream(1100), Water.industrial(), FlowArrangement.COUNTERFLOW);
        final Solution s = p.plant
                .specify()
                .given(p.hot.flow(), kilogramsPerSecond(50))
                .given(p.hot.temperature(), celsius(520))
                .given(p.hot.pressure(), bar(1))
                .given(p.cold.temperature(), celsius(100))
                .given(p.cold.pressure(), megapascal(5))
                .given(p.coldEnd.temperature(), celsius(400))
                .given(p.exchanger.pinch(), kelvins(15))
                .solve();
        assertEquals(6.492, s.value(p.cold.flow()).inKilogramsPerSecond(), 0.0005);
        assertEquals(18.008, s.value(p.exchanger.duty()).inMegawatts(), 0.001);
        assertEquals(192.6, s.value(p.hotEnd.temperature()).inCelsius(), 0.05);
        assertEquals(120, s.value(p.exchanger.warmEndDifference()).inKelvins(), 1e-9);
        assertEquals(92.6, s.value(p.exchanger.coldEndDifference()).inKelvins(), 0.05);
    }
}
