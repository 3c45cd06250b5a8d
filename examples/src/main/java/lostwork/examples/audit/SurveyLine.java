package lostwork.examples.audit;

import lostwork.quantity.Duration;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/**
 * One stream of the survey, read and checked.
 *
 * @param line line number in the survey file
 * @param tag the name of the stream at the works
 * @param medium what flows
 * @param flow how much
 * @param supply temperature at which the stream leaves the process
 * @param lowest lowest temperature that it may be cooled to, at most the supply temperature
 * @param pressure absolute pressure
 * @param hoursPerYear hours a year
 * @param flowUncertainty relative expanded uncertainty of the flow
 * @param temperatureUncertainty expanded uncertainty of the supply temperature
 */
record SurveyLine(
        int line,
        String tag,
        Medium medium,
        SurveyFlow flow,
        Temperature supply,
        Temperature lowest,
        Pressure pressure,
        Duration hoursPerYear,
        Ratio flowUncertainty,
        TemperatureSpan temperatureUncertainty) {}
