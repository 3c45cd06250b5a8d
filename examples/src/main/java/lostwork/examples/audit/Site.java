package lostwork.examples.audit;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.quantity.EmissionFactor;
import lostwork.quantity.EnergyPrice;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/**
 * What the site file states.
 *
 * @param name name of the works
 * @param ambientTemperature temperature of the surroundings, T0
 * @param ambientPressure pressure of the surroundings, p0
 * @param relativeHumidity relative humidity of the surroundings
 * @param currency label of the currency in reports
 * @param powerPrice price of electricity
 * @param heatPrice price of heat
 * @param gridCarbonIntensity carbon dioxide per energy from the grid
 */
record Site(
        String name,
        Temperature ambientTemperature,
        Pressure ambientPressure,
        Ratio relativeHumidity,
        String currency,
        EnergyPrice powerPrice,
        EnergyPrice heatPrice,
        EmissionFactor gridCarbonIntensity) {
    /** {@return the surroundings of the site, which all exergy is counted against} */
    ReferenceEnvironment ambient() {
        return ReferenceEnvironment.of(ambientTemperature, ambientPressure).withRelativeHumidity(relativeHumidity);
    }
}
