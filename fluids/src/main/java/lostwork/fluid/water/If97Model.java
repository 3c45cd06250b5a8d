package lostwork.fluid.water;

import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.Phase;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;

/** Water and steam by IAPWS-IF97: which region a state lies in, and the way there from each pair of properties. */
final class If97Model implements FluidModel {
    /** Molar mass of R7-97(2012), in kg/mol. */
    private static final double MOLAR_MASS = 18.015257e-3;

    private static final double LOWEST_K = 273.15;
    /** Where regions 1 and 2 end and region 3 begins. */
    private static final double REGION_3_FROM_K = 623.15;
    /** Where region 3 ends. */
    private static final double REGION_3_TO_K = 863.15;
    /** Where region 5 begins. */
    private static final double REGION_5_FROM_K = 1073.15;

    private static final double HIGHEST_K = 2273.15;
    private static final double LOWEST_PA = 1;
    private static final double REGION_5_HIGHEST_PA = 50e6;
    private static final double HIGHEST_PA = 100e6;
    /** A temperature this far below the range is rounding, not an error. */
    private static final double ROUNDING_K = 1e-9;

    private static final String SOURCE = "IAPWS-IF97";

    private final FluidRange range = new FluidRange(LOWEST_K, HIGHEST_K, LOWEST_PA, HIGHEST_PA, SOURCE);
    private final If97Saturation saturation = new If97Saturation(table("r7-97-table-34-region4"));
    private final If97Gibbs region1 = new If97Gibbs(1, table("r7-97-table-02-region1"), null, 272.15, 630);
    private final If97Gibbs region2 = new If97Gibbs(
            2, table("r7-97-table-11-region2-residual"), table("r7-97-table-10-region2-ideal"), 272.15, 1078);
    private final If97Region3 region3 = new If97Region3(table("r7-97-table-30-region3"));
    private final If97Gibbs region5 = new If97Gibbs(
            5, table("r7-97-table-38-region5-residual"), table("r7-97-table-37-region5-ideal"), 1060, 2280);
    private final If97Boundary boundary23 = new If97Boundary(table("r7-97-table-01-b23"));
    private final If97Starts starts = new If97Starts();
    /** Saturation pressure where regions 1, 2 and 3 meet. */
    private final double region3FromPressure = saturation.pressure(REGION_3_FROM_K);

    private final double lowestSaturationPressure = saturation.pressure(LOWEST_K);

    private static CoefficientTable table(String name) {
        return CoefficientTable.read("if97/" + name + ".txt");
    }

    @Override
    public String name() {
        return "water";
    }

    @Override
    public double molarMass() {
        return MOLAR_MASS;
    }

    @Override
    public FluidRange range() {
        return range;
    }

    @Override
    public Provenance provenance() {
        return If97Provenance.PROVENANCE;
    }

    @Override
    public SaturationModel saturation() {
        return saturation;
    }

    @Override
    public double highestTemperatureAt(double pressure) {
        return pressure > REGION_5_HIGHEST_PA ? REGION_5_FROM_K : HIGHEST_K;
    }

    @Override
    public double highestPressureAt(double temperature) {
        return temperature > REGION_5_FROM_K ? REGION_5_HIGHEST_PA : HIGHEST_PA;
    }

    @Override
    public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
        requireStatePair(temperature, pressure);
        evaluate(temperature, pressure, side == PhaseSide.LIQUID, Workspace.ofThread(), out);
    }

    private void evaluate(double temperature, double pressure, boolean liquid, Workspace w, StatePoint out) {
        if (temperature <= REGION_3_FROM_K) {
            (liquid ? region1 : region2).evaluate(temperature, pressure, w, out);
        } else if (temperature > REGION_5_FROM_K) {
            region5.evaluate(temperature, pressure, w, out);
        } else if (temperature > REGION_3_TO_K || pressure <= boundary23.pressure(temperature)) {
            region2.evaluate(temperature, pressure, w, out);
        } else {
            region3(temperature, pressure, liquid, w, out);
        }
    }

    @Override
    public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
        requireStatePair(temperature, pressure);
        final boolean liquid =
                temperature < If97Saturation.CRITICAL_TEMPERATURE_K && pressure >= saturation.pressure(temperature);
        evaluate(temperature, pressure, liquid, Workspace.ofThread(), out);
    }

    private void region3(double temperature, double pressure, boolean liquid, Workspace w, StatePoint out) {
        final boolean supercritical = temperature >= If97Saturation.CRITICAL_TEMPERATURE_K;
        final boolean dense = supercritical ? pressure >= region3.pressure(322, temperature, w) : liquid;
        final double density = region3.density(temperature, pressure, dense, dense ? 770 : 80, w);
        if (Double.isNaN(density)) {
            throw If97Failure.of("region 3", "T = " + temperature + " K, p = " + pressure + " Pa", 60);
        }
        final Phase phase = region3Phase(temperature, pressure, liquid);
        region3.evaluate(density, temperature, phase, w, out);
        out.pressure = pressure;
    }

    private void requireStatePair(double temperature, double pressure) {
        range.requireTemperature(temperature);
        range.requirePressure(pressure);
        if (temperature > REGION_5_FROM_K && pressure > REGION_5_HIGHEST_PA) {
            throw new OutOfRangeException(
                    "pressure",
                    pressure,
                    LOWEST_PA,
                    REGION_5_HIGHEST_PA,
                    "Pa",
                    SOURCE + " region 5, above 1073.15 K",
                    "take a lower pressure or a temperature up to 1073.15 K");
        }
    }

    @Override
    public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
        range.requirePressure(pressure);
        final Workspace w = Workspace.ofThread();
        if (pressure > region3FromPressure) {
            if (enthalpy <= region1.enthalpy(REGION_3_FROM_K, pressure, w)) {
                liquidAtEnthalpy(pressure, enthalpy, w, out);
                return;
            }
            if (enthalpy < region2.enthalpy(boundary23.temperature(pressure), pressure, w)) {
                region3AtEnthalpy(pressure, enthalpy, w, out);
                return;
            }
        } else if (pressure >= lowestSaturationPressure) {
            final double t = saturation.temperature(pressure);
            final StatePoint liquid = out.liquidSide();
            region1.evaluate(t, pressure, w, liquid);
            if (enthalpy <= liquid.enthalpy) {
                liquidAtEnthalpy(pressure, enthalpy, w, out);
                return;
            }
            final StatePoint vapour = out.vapourSide();
            region2.evaluate(t, pressure, w, vapour);
            if (enthalpy < vapour.enthalpy) {
                out.setTwoPhase(liquid, vapour, (enthalpy - liquid.enthalpy) / (vapour.enthalpy - liquid.enthalpy));
                out.enthalpy = enthalpy;
                return;
            }
        }
        vapourAtEnthalpy(pressure, enthalpy, w, out);
    }

    private void liquidAtEnthalpy(double pressure, double enthalpy, Workspace w, StatePoint out) {
        requireEnthalpy(pressure, enthalpy, enthalpy >= region1.enthalpy(LOWEST_K, pressure, w), w);
        region1.atPressureEnthalpy(pressure, enthalpy, starts.region1Enthalpy(pressure, enthalpy, w), w, out);
    }

    private void vapourAtEnthalpy(double pressure, double enthalpy, Workspace w, StatePoint out) {
        if (pressure < lowestSaturationPressure) {
            requireEnthalpy(pressure, enthalpy, enthalpy >= region2.enthalpy(LOWEST_K, pressure, w), w);
        }
        if (enthalpy <= region2.enthalpy(REGION_5_FROM_K, pressure, w)) {
            region2.atPressureEnthalpy(pressure, enthalpy, starts.region2Enthalpy(pressure, enthalpy, w), w, out);
        } else {
            requireEnthalpy(
                    pressure,
                    enthalpy,
                    pressure <= REGION_5_HIGHEST_PA && enthalpy <= region5.enthalpy(HIGHEST_K, pressure, w),
                    w);
            region5.atPressureEnthalpy(pressure, enthalpy, 1500, w, out);
        }
    }

    private void region3AtEnthalpy(double pressure, double enthalpy, Workspace w, StatePoint out) {
        final boolean dense;
        if (pressure < If97Saturation.CRITICAL_PRESSURE_PA) {
            final double t = saturation.temperature(pressure);
            final StatePoint liquid = out.liquidSide();
            region3(t, pressure, true, w, liquid);
            dense = enthalpy <= liquid.enthalpy;
            if (!dense) {
                final StatePoint vapour = out.vapourSide();
                region3(t, pressure, false, w, vapour);
                if (enthalpy < vapour.enthalpy) {
                    out.setTwoPhase(liquid, vapour, (enthalpy - liquid.enthalpy) / (vapour.enthalpy - liquid.enthalpy));
                    out.enthalpy = enthalpy;
                    return;
                }
            }
        } else {
            dense = enthalpy <= starts.enthalpy3ab(pressure);
        }
        final double density = 1 / starts.region3VolumeEnthalpy(pressure, enthalpy, dense, w);
        final double temperature = starts.region3TemperatureEnthalpy(pressure, enthalpy, dense, w);
        if (!region3.atPressureEnthalpy(pressure, enthalpy, density, temperature, Phase.LIQUID, w, out)) {
            throw If97Failure.of("region 3", "p = " + pressure + " Pa, h = " + enthalpy + " J/kg", 60);
        }
        out.phase = region3Phase(out.temperature, pressure, dense);
    }

    private static Phase region3Phase(double temperature, double pressure, boolean dense) {
        if (temperature >= If97Saturation.CRITICAL_TEMPERATURE_K) {
            return pressure >= If97Saturation.CRITICAL_PRESSURE_PA ? Phase.SUPERCRITICAL : Phase.VAPOUR;
        }
        return dense ? Phase.LIQUID : Phase.VAPOUR;
    }

    private void requireEnthalpy(double pressure, double enthalpy, boolean inRange, Workspace w) {
        if (!inRange) {
            final If97Gibbs lowestRegion = pressure >= lowestSaturationPressure ? region1 : region2;
            final If97Gibbs highestRegion = pressure <= REGION_5_HIGHEST_PA ? region5 : region2;
            throw new OutOfRangeException(
                    "enthalpy",
                    enthalpy,
                    lowestRegion.enthalpy(LOWEST_K, pressure, w),
                    highestRegion.enthalpy(highestTemperatureAt(pressure), pressure, w),
                    "J/kg",
                    SOURCE + " at p = " + pressure + " Pa",
                    "");
        }
    }

    @Override
    public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        range.requirePressure(pressure);
        final Workspace w = Workspace.ofThread();
        if (pressure > region3FromPressure) {
            if (entropy <= region1.entropy(REGION_3_FROM_K, pressure, w)) {
                liquidAtEntropy(pressure, entropy, w, out);
                return;
            }
            if (entropy < region2.entropy(boundary23.temperature(pressure), pressure, w)) {
                region3AtEntropy(pressure, entropy, w, out);
                return;
            }
        } else if (pressure >= lowestSaturationPressure) {
            final double t = saturation.temperature(pressure);
            final StatePoint liquid = out.liquidSide();
            region1.evaluate(t, pressure, w, liquid);
            if (entropy <= liquid.entropy) {
                liquidAtEntropy(pressure, entropy, w, out);
                return;
            }
            final StatePoint vapour = out.vapourSide();
            region2.evaluate(t, pressure, w, vapour);
            if (entropy < vapour.entropy) {
                out.setTwoPhase(liquid, vapour, (entropy - liquid.entropy) / (vapour.entropy - liquid.entropy));
                out.entropy = entropy;
                return;
            }
        }
        vapourAtEntropy(pressure, entropy, w, out);
    }

    private void liquidAtEntropy(double pressure, double entropy, Workspace w, StatePoint out) {
        requireEntropy(pressure, entropy, entropy >= region1.entropy(LOWEST_K, pressure, w), w);
        region1.atPressureEntropy(pressure, entropy, starts.region1Entropy(pressure, entropy, w), w, out);
    }

    private void vapourAtEntropy(double pressure, double entropy, Workspace w, StatePoint out) {
        if (pressure < lowestSaturationPressure) {
            requireEntropy(pressure, entropy, entropy >= region2.entropy(LOWEST_K, pressure, w), w);
        }
        if (entropy <= region2.entropy(REGION_5_FROM_K, pressure, w)) {
            region2.atPressureEntropy(pressure, entropy, starts.region2Entropy(pressure, entropy, w), w, out);
        } else {
            requireEntropy(
                    pressure,
                    entropy,
                    pressure <= REGION_5_HIGHEST_PA && entropy <= region5.entropy(HIGHEST_K, pressure, w),
                    w);
            region5.atPressureEntropy(pressure, entropy, 1500, w, out);
        }
    }

    private void region3AtEntropy(double pressure, double entropy, Workspace w, StatePoint out) {
        boolean dense = entropy <= If97Starts.CRITICAL_ENTROPY;
        if (pressure < If97Saturation.CRITICAL_PRESSURE_PA) {
            final double t = saturation.temperature(pressure);
            final StatePoint liquid = out.liquidSide();
            region3(t, pressure, true, w, liquid);
            dense = entropy <= liquid.entropy;
            if (!dense) {
                final StatePoint vapour = out.vapourSide();
                region3(t, pressure, false, w, vapour);
                if (entropy < vapour.entropy) {
                    out.setTwoPhase(liquid, vapour, (entropy - liquid.entropy) / (vapour.entropy - liquid.entropy));
                    out.entropy = entropy;
                    return;
                }
            }
        }
        final double density = 1 / starts.region3VolumeEntropy(pressure, entropy, w);
        final double temperature = starts.region3TemperatureEntropy(pressure, entropy, w);
        if (!region3.atPressureEntropy(pressure, entropy, density, temperature, Phase.LIQUID, w, out)) {
            throw If97Failure.of("region 3", "p = " + pressure + " Pa, s = " + entropy + " J/(kg K)", 60);
        }
        out.phase = region3Phase(out.temperature, pressure, dense);
    }

    private void requireEntropy(double pressure, double entropy, boolean inRange, Workspace w) {
        if (!inRange) {
            final If97Gibbs lowestRegion = pressure >= lowestSaturationPressure ? region1 : region2;
            final If97Gibbs highestRegion = pressure <= REGION_5_HIGHEST_PA ? region5 : region2;
            throw new OutOfRangeException(
                    "entropy",
                    entropy,
                    lowestRegion.entropy(LOWEST_K, pressure, w),
                    highestRegion.entropy(highestTemperatureAt(pressure), pressure, w),
                    "J/(kg K)",
                    SOURCE + " at p = " + pressure + " Pa",
                    "");
        }
    }

    @Override
    public void atTemperatureVapourFraction(double temperature, double vapourFraction, StatePoint out) {
        requireSaturation(temperature);
        wet(temperature, saturation.pressure(temperature), vapourFraction, out);
    }

    @Override
    public void atPressureVapourFraction(double pressure, double vapourFraction, StatePoint out) {
        if (!(pressure >= lowestSaturationPressure && pressure <= If97Saturation.CRITICAL_PRESSURE_PA)) {
            throw new OutOfRangeException(
                    "pressure",
                    pressure,
                    lowestSaturationPressure,
                    If97Saturation.CRITICAL_PRESSURE_PA,
                    "Pa",
                    SOURCE + " saturation line",
                    "");
        }
        wet(saturation.temperature(pressure), pressure, vapourFraction, out);
    }

    private void wet(double temperature, double pressure, double vapourFraction, StatePoint out) {
        if (!(vapourFraction >= 0 && vapourFraction <= 1)) {
            throw new OutOfRangeException("vapour fraction", vapourFraction, 0, 1, "", "its meaning", "");
        }
        final Workspace w = Workspace.ofThread();
        final StatePoint liquid = out.liquidSide();
        final StatePoint vapour = out.vapourSide();
        evaluate(temperature, pressure, true, w, liquid);
        evaluate(temperature, pressure, false, w, vapour);
        out.setTwoPhase(liquid, vapour, vapourFraction);
    }

    @Override
    public void saturatedAtTemperature(double temperature, PhaseSide side, StatePoint out) {
        requireSaturation(temperature);
        evaluate(temperature, saturation.pressure(temperature), side == PhaseSide.LIQUID, Workspace.ofThread(), out);
        out.vapourFraction = side == PhaseSide.LIQUID ? 0 : 1;
    }

    private static void requireSaturation(double temperature) {
        if (!(temperature >= LOWEST_K && temperature <= If97Saturation.CRITICAL_TEMPERATURE_K)) {
            throw new OutOfRangeException(
                    "temperature",
                    temperature,
                    LOWEST_K,
                    If97Saturation.CRITICAL_TEMPERATURE_K,
                    "K",
                    SOURCE + " saturation line",
                    "");
        }
    }
}
