package lostwork.fluid.gas;

import java.util.Locale;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.exergy.WaterVapourPressure;
import lostwork.fluid.Provenance;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;
import lostwork.solve.BracketedRoot;

/**
 * Air with water vapour, as an ideal mixture of constant composition.
 *
 * <pre>{@code
 * var air = HumidAir.of(celsius(12), mbar(1013), percent(70));    // as measured at the intake
 * air.state(celsius(300), bar(8));                                // the same air, compressed
 * air.waterDewPoint(bar(8));
 * }</pre>
 *
 * <h2>Saturation</h2>
 * <p>Relative humidity is the partial pressure of the water over the vapour pressure of pure water, of ice below
 * 273.16 K (IAPWS SR1-86(1992) and R14-08(2011)). The dissolved air and the pressure of the air on the water raise the
 * true saturation by about 0.4 % at 1 bar; this is left out.
 *
 * <h2>Limits of the model</h2>
 * <p>More than 100 % relative humidity is refused when the air is made. The air that is made keeps its water: cooled
 * below {@link #waterDewPoint} or compressed beyond it, its states are those of a supersaturated vapour, which does not
 * condense. Ask {@link #relativeHumidity}, which then answers more than 100 %.
 */
public final class HumidAir extends IdealGas {
    private static final double ICE_POINT_K = 273.15;
    private static final BracketedRoot ROOTS = BracketedRoot.limitedTo(200);

    private final double humidityRatio;

    private HumidAir(double humidityRatio) {
        super(new IdealGasModel(
                String.format(Locale.ROOT, "humid air, %.3f g water per kg dry air", 1000 * humidityRatio),
                mix(humidityRatio),
                new Provenance.Source("dry air: species Air of NASA/TP-2002-211556", "from memory"),
                new Provenance.Source(
                        "vapour pressure of water: IAPWS SR1-86(1992), over ice IAPWS R14-08(2011)",
                        "from memory, confirmed by the check values")));
        this.humidityRatio = humidityRatio;
    }

    private static GasComposition mix(double humidityRatio) {
        final GasComposition dry = DryAir.standard().composition();
        final double water = humidityRatio * dry.molarMassKilogramPerMole() / Species.H2O.molarMassKilogramPerMole();
        final GasComposition.Builder builder = GasComposition.byMole();
        for (int i = 0; i < dry.species().size(); i++) {
            builder.add(dry.species().get(i), dry.fraction(i));
        }
        return builder.add(Species.H2O, water).buildNormalised();
    }

    /**
     * {@return the air that has a relative humidity at a temperature and a pressure}
     *
     * @param temperature the temperature at which the humidity was measured
     * @param pressure the absolute pressure at which it was measured
     * @param relativeHumidity the relative humidity, 0 to 100 %
     * @throws OutOfRangeException if the humidity is outside 0 to 100 %, or water would boil at this temperature and
     *     pressure, so that no air is left
     */
    public static HumidAir of(Temperature temperature, Pressure pressure, Ratio relativeHumidity) {
        if (!(relativeHumidity.si() >= 0 && relativeHumidity.si() <= 1)) {
            throw new OutOfRangeException(
                    "relative humidity",
                    relativeHumidity.si(),
                    0,
                    1,
                    "1",
                    "air without fog",
                    "state it in percent with percent(70), or as a fraction with fraction(0.7)");
        }
        return ofWaterPressure(
                relativeHumidity.si() * WaterVapourPressure.at(temperature).si(), pressure.si());
    }

    /**
     * {@return the air of a reference environment, with the water vapour that the environment states}
     *
     * <p>The dry part is that of {@link DryAir#standard}, whatever dry air the environment names.
     *
     * @param environment the environment, its relative humidity stated
     * @throws lostwork.exergy.IncompleteEnvironmentException if the humidity has not been stated
     */
    public static HumidAir of(ReferenceEnvironment environment) {
        return ofWaterPressure(
                environment.waterVapourPressure().si(), environment.pressure().si());
    }

    /**
     * {@return the air that holds a mass of water per mass of dry air}
     *
     * @param humidityRatio mass of water per mass of dry air, 0 to 10
     * @throws OutOfRangeException if the ratio is outside 0 to 10
     */
    public static HumidAir ofHumidityRatio(Ratio humidityRatio) {
        if (!(humidityRatio.si() >= 0 && humidityRatio.si() <= 10)) {
            throw new OutOfRangeException(
                    "humidity ratio",
                    humidityRatio.si(),
                    0,
                    10,
                    "1",
                    "mass of water per mass of dry air",
                    "beyond this, treat the gas as steam with some air, by GasComposition");
        }
        return new HumidAir(humidityRatio.si());
    }

    /**
     * {@return the air that is saturated at a dew point}
     *
     * @param dewPoint the dew point, or frost point below 0.01 °C
     * @param pressure the absolute pressure at which it was measured
     * @throws OutOfRangeException if water would boil at this temperature and pressure
     */
    public static HumidAir ofDewPoint(Temperature dewPoint, Pressure pressure) {
        return ofWaterPressure(WaterVapourPressure.at(dewPoint).si(), pressure.si());
    }

    /**
     * {@return the air whose adiabatic saturation with liquid water ends at the wet-bulb temperature}
     *
     * <p>The balance is that of the thermodynamic wet bulb: air and the water that it takes up, liquid at the wet-bulb
     * temperature, have together the enthalpy of the saturated air. A psychrometer in a good draught reads it closely.
     *
     * @param dryBulb the temperature of the air
     * @param wetBulb the thermodynamic wet-bulb temperature, 0 °C or above, not above the dry bulb
     * @param pressure the absolute pressure
     * @throws OutOfRangeException if the wet bulb is below 0 °C or above the dry bulb, or even dry air would not cool as
     *     far
     */
    public static HumidAir ofWetBulb(Temperature dryBulb, Temperature wetBulb, Pressure pressure) {
        final double dry = dryBulb.si();
        final double wet = wetBulb.si();
        if (!(wet >= ICE_POINT_K && wet <= dry)) {
            throw new OutOfRangeException(
                    "wet-bulb temperature",
                    wet,
                    ICE_POINT_K,
                    dry,
                    "K",
                    "liquid water on the bulb, evaporating into the air",
                    "below 0 °C give the relative humidity or the frost point instead");
        }
        final double saturated = ratioAt(WaterVapourPressure.at(wetBulb).si(), pressure.si());
        final double ratio =
                (airEnthalpy(wet) - airEnthalpy(dry) + saturated * (vapourEnthalpy(wet) - liquidEnthalpy(wet)))
                        / (vapourEnthalpy(dry) - liquidEnthalpy(wet));
        if (!(ratio >= 0)) {
            throw new OutOfRangeException(
                    "wet-bulb temperature",
                    wet,
                    wetBulbOf(0, dry, pressure.si()),
                    dry,
                    "K",
                    "even dry air cools no further",
                    "");
        }
        return new HumidAir(ratio);
    }

    private static HumidAir ofWaterPressure(double waterPressure, double pressure) {
        return new HumidAir(ratioAt(waterPressure, pressure));
    }

    /** {@return the mass of water per mass of dry air at a partial pressure of the water} */
    private static double ratioAt(double waterPressure, double pressure) {
        if (!(waterPressure < pressure)) {
            throw new OutOfRangeException(
                    "partial pressure of water",
                    waterPressure,
                    0,
                    pressure,
                    "Pa",
                    "the pressure of the humid air",
                    "the gas would be steam alone");
        }
        return Species.H2O.molarMassKilogramPerMole()
                / DryAir.standard().composition().molarMassKilogramPerMole()
                * waterPressure
                / (pressure - waterPressure);
    }

    /** {@return the mass of water per mass of dry air} */
    public Ratio humidityRatio() {
        return Ratio.fraction(humidityRatio);
    }

    /**
     * {@return the relative humidity of this air at a temperature and a pressure; above 1 where water would condense}
     *
     * @param temperature the temperature
     * @param pressure the absolute pressure
     * @throws OutOfRangeException if the temperature is above the critical one of water: there is no saturation
     */
    public Ratio relativeHumidity(Temperature temperature, Pressure pressure) {
        return Ratio.fraction(waterPressure(pressure.si())
                / WaterVapourPressure.at(temperature).si());
    }

    /**
     * {@return the temperature at which adiabatic saturation with liquid water ends}
     *
     * @param temperature the temperature of the air, at or above its dew point
     * @param pressure the absolute pressure
     * @throws OutOfRangeException if the air is supersaturated, or its wet bulb lies below 0 °C
     */
    public Temperature wetBulb(Temperature temperature, Pressure pressure) {
        final double t = temperature.si();
        final double relative = waterPressure(pressure.si())
                / WaterVapourPressure.at(temperature).si();
        // A rounding beyond saturation is still saturation.
        if (!(relative <= 1 + 1e-12)) {
            throw new OutOfRangeException(
                    "relative humidity", relative, 0, 1, "1", "air without fog", "condense the surplus water first");
        }
        return Temperature.kelvin(wetBulbOf(humidityRatio, t, pressure.si()));
    }

    /**
     * {@return the enthalpy of the humid air per mass of dry air, counted as in air-conditioning practice: dry air and
     * liquid water at 0 °C have none}
     *
     * @param temperature the temperature
     * @throws OutOfRangeException if the temperature lies outside the range of the air
     */
    public SpecificEnergy enthalpyPerDryAir(Temperature temperature) {
        final double t = temperature.si();
        model().range().requireTemperature(t);
        return SpecificEnergy.joulesPerKilogram(airEnthalpy(t)
                - airEnthalpy(ICE_POINT_K)
                + humidityRatio * (vapourEnthalpy(t) - liquidEnthalpy(ICE_POINT_K)));
    }

    private double waterPressure(double pressure) {
        return composition().fraction(Species.H2O) * pressure;
    }

    private static double wetBulbOf(double humidityRatio, double temperature, double pressure) {
        final double boiling = WaterVapourPressure.dewPoint(Pressure.pascal(Math.min(
                        pressure, WaterVapourPressure.criticalPressure().si())))
                .si();
        // Just below boiling the saturated air is all water; the wet bulb stays clear of it.
        final double highest = Math.min(temperature, boiling * (1 - 1e-9));
        if (!(excess(humidityRatio, temperature, pressure, ICE_POINT_K) <= 0)) {
            throw new OutOfRangeException(
                    "temperature of the air",
                    temperature,
                    ICE_POINT_K,
                    Double.MAX_VALUE,
                    "K",
                    "wet bulb with liquid water",
                    "the wet bulb of this air lies below 0 °C, where the bulb is iced");
        }
        if (excess(humidityRatio, temperature, pressure, highest) <= 0) {
            return highest;
        }
        return ROOTS.solve(
                "wet-bulb temperature", wet -> excess(humidityRatio, temperature, pressure, wet), ICE_POINT_K, highest);
    }

    /** {@return how much more enthalpy saturated air at a wet-bulb temperature has than air and the water it takes up} */
    private static double excess(double humidityRatio, double temperature, double pressure, double wet) {
        final double saturated =
                ratioAt(WaterVapourPressure.at(Temperature.kelvin(wet)).si(), pressure);
        return airEnthalpy(wet)
                - airEnthalpy(temperature)
                + saturated * vapourEnthalpy(wet)
                - humidityRatio * vapourEnthalpy(temperature)
                - (saturated - humidityRatio) * liquidEnthalpy(wet);
    }

    private static double airEnthalpy(double temperature) {
        return ((IdealGasModel) DryAir.standard().model()).curve().enthalpy(temperature);
    }

    private static double vapourEnthalpy(double temperature) {
        return Species.H2O.curve().enthalpy(temperature) / Species.H2O.molarMassKilogramPerMole();
    }

    /** {@return the enthalpy of liquid water in J/kg, counted from the elements; its small change with pressure left out} */
    private static double liquidEnthalpy(double temperature) {
        return Species.of("H2O(l)").curve().enthalpy(temperature) / Species.H2O.molarMassKilogramPerMole();
    }
}
