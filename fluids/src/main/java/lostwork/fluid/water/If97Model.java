package lostwork.fluid.water;

import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;

/** Water and steam by IAPWS-IF97 behind the primitive interface. */
final class If97Model implements FluidModel {
    /** Molar mass of R7-97(2012), in kg/mol. */
    private static final double MOLAR_MASS = 18.015257e-3;
    /** Width of the saturation line in relative pressure, wider than its rounding; liquid is returned on it. */
    private static final double LINE_WIDTH = 1e-10;

    /**
     * Liquid water at 298.15 K and 1 bar: enthalpy of formation -285.830 kJ/mol and entropy 69.95 J/(mol K). J. D. Cox,
     * D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics (1989); from memory.
     */
    private static final double FORMATION_ENTHALPY = -285.830e3;

    private static final double ABSOLUTE_ENTROPY = 69.95;
    private static final double STANDARD_K = 298.15;
    private static final double STANDARD_PA = 1e5;

    private final FluidRange range = new FluidRange(
            If97Equations.LOWEST_K,
            If97Equations.HIGHEST_K,
            If97Equations.LOWEST_PA,
            If97Equations.HIGHEST_PA,
            If97Failure.SOURCE);
    private final If97Equations equations = new If97Equations();
    private final If97Starts starts = new If97Starts();
    private final If97PressureFlash byEnthalpy = new If97PressureFlash.ByEnthalpy(equations, starts);
    private final If97PressureFlash byEntropy = new If97PressureFlash.ByEntropy(equations, starts);
    private final If97Isentrope isentrope = new If97Isentrope(equations, byEntropy);

    private final double enthalpyFromElements;
    private final double entropyFromAbsoluteZero;

    If97Model() {
        final StatePoint standard = new StatePoint();
        equations.evaluate(STANDARD_K, STANDARD_PA, true, Workspace.ofThread(), standard);
        enthalpyFromElements = FORMATION_ENTHALPY / MOLAR_MASS - standard.enthalpy;
        entropyFromAbsoluteZero = ABSOLUTE_ENTROPY / MOLAR_MASS - standard.entropy;
    }

    @Override
    public double enthalpyFromElements() {
        return enthalpyFromElements;
    }

    @Override
    public double entropyFromAbsoluteZero() {
        return entropyFromAbsoluteZero;
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
        return equations.saturation;
    }

    @Override
    public double highestTemperatureAt(double pressure) {
        return If97Equations.highestTemperatureAt(pressure);
    }

    @Override
    public double highestPressureAt(double temperature) {
        return temperature > If97Equations.REGION_5_FROM_K
                ? If97Equations.REGION_5_HIGHEST_PA
                : If97Equations.HIGHEST_PA;
    }

    private void requireInRange(double temperature, double pressure) {
        range.requireTemperature(temperature);
        range.requirePressure(pressure);
        if (temperature > If97Equations.REGION_5_FROM_K && pressure > If97Equations.REGION_5_HIGHEST_PA) {
            throw If97Failure.outside(
                    "pressure",
                    pressure,
                    If97Equations.LOWEST_PA,
                    If97Equations.REGION_5_HIGHEST_PA,
                    "Pa",
                    "region 5, above " + If97Equations.REGION_5_FROM_K + " K");
        }
    }

    @Override
    public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
        requireInRange(temperature, pressure);
        equations.evaluate(temperature, pressure, side == PhaseSide.LIQUID, Workspace.ofThread(), out);
    }

    @Override
    public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
        requireInRange(temperature, pressure);
        final boolean liquid = temperature < If97Saturation.CRITICAL_TEMPERATURE_K
                && pressure >= equations.saturation.pressure(temperature) * (1 - LINE_WIDTH);
        equations.evaluate(temperature, pressure, liquid, Workspace.ofThread(), out);
    }

    @Override
    public void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
        range.requirePressure(pressure);
        requireFinite("enthalpy", enthalpy, "J/kg");
        byEnthalpy.find(pressure, enthalpy, Workspace.ofThread(), out);
    }

    @Override
    public void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        range.requirePressure(pressure);
        requireFinite("entropy", entropy, "J/(kg K)");
        byEntropy.find(pressure, entropy, Workspace.ofThread(), out);
    }

    private static void requireFinite(String quantity, double value, String unit) {
        if (!(value >= -Double.MAX_VALUE && value <= Double.MAX_VALUE)) {
            throw If97Failure.outside(quantity, value, -Double.MAX_VALUE, Double.MAX_VALUE, unit, "");
        }
    }

    @Override
    public void atEnthalpyEntropy(double enthalpy, double entropy, StatePoint out) {
        if (!isentrope.find(enthalpy, entropy, Workspace.ofThread(), out)) {
            // Outside the range, in a step between regions, or far from any first guess.
            FluidModel.super.atEnthalpyEntropy(enthalpy, entropy, out);
        }
    }

    @Override
    public void atTemperatureVolume(double temperature, double volume, StatePoint out) {
        if (!equations.evaluateRegion3(temperature, volume, Workspace.ofThread(), out)) {
            FluidModel.super.atTemperatureVolume(temperature, volume, out);
        }
    }
}
