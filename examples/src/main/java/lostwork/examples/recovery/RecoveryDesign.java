package lostwork.examples.recovery;

import static lostwork.quantity.Power.kilowatts;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.PressureDifference.kilopascals;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;

import java.util.List;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * The engineering assumptions of a recovery plant, each with where it comes from. The efficiencies of turbine and
 * generator depend on their size and stand in {@link MachineSize}.
 *
 * @param lowestGasTemperature gas that is colder gets no steam plant
 * @param smallestPlant a plant that would give less is not built
 * @param pinch least temperature difference between gas and water in the boiler
 * @param superheaterApproach gas temperature less steam temperature at the hot end of the boiler
 * @param highestSteamTemperature the steam is not superheated further
 * @param leastSuperheat the steam is superheated at least so far
 * @param lowestPressure the search for the evaporation pressure begins here
 * @param highestPressure and ends here
 * @param lowestVapourFraction least share of vapour in the steam that leaves the turbine
 * @param condenserApproach condensing temperature less that of the ambient air
 * @param lowestCondensingTemperature the condenser is not run colder
 * @param condensateSubcooling how far the condensate is colder than its boiling point
 * @param gasPressureLoss pressure loss of the gas in the boiler, made up by the draught fan
 * @param draughtFanEfficiency isentropic efficiency of the draught fan
 * @param condenserFanShare electric power of the condenser's fans over its heat
 * @param pumpEfficiency isentropic efficiency of the feed pump
 * @param motorEfficiency efficiency of the motors
 */
public record RecoveryDesign(
        Assumption<Temperature> lowestGasTemperature,
        Assumption<Power> smallestPlant,
        Assumption<TemperatureSpan> pinch,
        Assumption<TemperatureSpan> superheaterApproach,
        Assumption<Temperature> highestSteamTemperature,
        Assumption<TemperatureSpan> leastSuperheat,
        Assumption<Pressure> lowestPressure,
        Assumption<Pressure> highestPressure,
        Assumption<Ratio> lowestVapourFraction,
        Assumption<TemperatureSpan> condenserApproach,
        Assumption<Temperature> lowestCondensingTemperature,
        Assumption<TemperatureSpan> condensateSubcooling,
        Assumption<PressureDifference> gasPressureLoss,
        Assumption<Ratio> draughtFanEfficiency,
        Assumption<Ratio> condenserFanShare,
        Assumption<Ratio> pumpEfficiency,
        Assumption<Ratio> motorEfficiency) {
    private static final String PRACTICE = "common practice, no source";
    /** S. M. Walas, Chemical Process Equipment: Selection and Design, Butterworths 1988, rules of thumb. */
    private static final String WALAS = "Walas (1988), from memory";

    /** {@return what is reasonable for a small waste-heat plant} */
    public static RecoveryDesign smallWasteHeatPlant() {
        return new RecoveryDesign(
                new Assumption<>("least gas temperature for steam", celsius(250), PRACTICE),
                new Assumption<>("smallest plant worth a look", kilowatts(50), PRACTICE),
                new Assumption<>("boiler pinch", kelvins(12), "8 K to 15 K in waste-heat boilers: " + PRACTICE),
                new Assumption<>("gas above steam at the hot end", kelvins(30), "20 K to 50 K: " + PRACTICE),
                new Assumption<>("highest steam temperature", celsius(450), "low-alloy superheater tubes: " + PRACTICE),
                new Assumption<>("least superheat", kelvins(20), PRACTICE),
                new Assumption<>("lowest evaporation pressure", bar(2), PRACTICE),
                new Assumption<>("highest evaporation pressure", bar(60), "small industrial sets: " + PRACTICE),
                new Assumption<>(
                        "least vapour at the turbine outlet",
                        percent(88),
                        "drops wear the blades of wetter stages: " + PRACTICE),
                new Assumption<>("condenser above ambient air", kelvins(22), "40 °F rule for air coolers: " + WALAS),
                new Assumption<>("lowest condensing temperature", celsius(30), "vacuum and frost: " + PRACTICE),
                new Assumption<>("subcooling of the condensate", kelvins(2), PRACTICE),
                new Assumption<>(
                        "gas pressure loss in the boiler", kilopascals(1.5), "1.5 kPa to 3.7 kPa: " + PRACTICE),
                new Assumption<>("draught fan isentropic efficiency", percent(65), "60 % to 70 %: " + PRACTICE),
                new Assumption<>("condenser fan power over its heat", percent(0.9), "0.5 % to 1.3 %: " + WALAS),
                new Assumption<>(
                        "feed pump isentropic efficiency", percent(50), "35 % to 55 % below 10 m³/h: " + PRACTICE),
                new Assumption<>(
                        "motor efficiency", percent(90), "class IE3 at 7.5 kW: IEC 60034-30-1:2014, from memory"));
    }

    /**
     * {@return these assumptions with another limit of the moisture}
     *
     * @param least least share of vapour in the steam that leaves the turbine
     * @param basis where the figure comes from
     */
    public RecoveryDesign withLowestVapourFraction(Ratio least, String basis) {
        return new RecoveryDesign(
                lowestGasTemperature,
                smallestPlant,
                pinch,
                superheaterApproach,
                highestSteamTemperature,
                leastSuperheat,
                lowestPressure,
                highestPressure,
                new Assumption<>(lowestVapourFraction.name(), least, basis),
                condenserApproach,
                lowestCondensingTemperature,
                condensateSubcooling,
                gasPressureLoss,
                draughtFanEfficiency,
                condenserFanShare,
                pumpEfficiency,
                motorEfficiency);
    }

    /** {@return the assumptions, in the order of the plant} */
    public List<Assumption<?>> assumptions() {
        return List.of(
                lowestGasTemperature,
                smallestPlant,
                pinch,
                superheaterApproach,
                highestSteamTemperature,
                leastSuperheat,
                lowestPressure,
                highestPressure,
                lowestVapourFraction,
                condenserApproach,
                lowestCondensingTemperature,
                condensateSubcooling,
                gasPressureLoss,
                draughtFanEfficiency,
                condenserFanShare,
                pumpEfficiency,
                motorEfficiency);
    }
}
