package lostwork.fluid;

import org.jspecify.annotations.Nullable;

/**
 * The properties of one state in coherent SI units: what a {@link FluidModel} writes and the hot path reads.
 *
 * <p>A mutable record on purpose: the caller owns it, keeps it and hands it in again, so that the property kernels
 * allocate nothing. It is the one type of this library that is neither immutable nor thread-safe; users of the typed
 * face never meet it.
 *
 * <p>The partial derivatives with pressure and enthalpy as the independent pair exist in every equilibrium state, the
 * two-phase region included. With dh = T ds + v dp (first and second law) the two of entropy need no field:
 * (∂s/∂h)<sub>p</sub> = 1/T and (∂s/∂p)<sub>h</sub> = −v/T.
 */
public final class StatePoint {
    /** Temperature in K. */
    public double temperature;
    /** Absolute pressure in Pa. */
    public double pressure;
    /** Specific volume in m³/kg. */
    public double volume;
    /** Specific enthalpy in J/kg. */
    public double enthalpy;
    /** Specific entropy in J/(kg K). */
    public double entropy;
    /** Isobaric heat capacity in J/(kg K); infinite in the two-phase region. */
    public double heatCapacity;
    /** (∂v/∂T)<sub>p</sub> in m³/(kg K); NaN in the two-phase region. */
    public double volumeByTemperature;
    /** (∂v/∂p)<sub>T</sub> in m³/(kg Pa); NaN in the two-phase region. */
    public double volumeByPressure;
    /** (∂T/∂h)<sub>p</sub> in K kg/J. */
    public double temperatureByEnthalpy;
    /** (∂T/∂p)<sub>h</sub> in K/Pa. */
    public double temperatureByPressureAtEnthalpy;
    /** (∂v/∂h)<sub>p</sub> in m³/J. */
    public double volumeByEnthalpy;
    /** (∂v/∂p)<sub>h</sub> in m³/(kg Pa). */
    public double volumeByPressureAtEnthalpy;
    /** Mass of vapour per total mass, 0 to 1; NaN away from the saturation line and the two-phase region. */
    public double vapourFraction;
    /** (∂x/∂h)<sub>p</sub> of the vapour fraction in kg/J; NaN in a single-phase state. */
    public double vapourFractionByEnthalpy;
    /** (∂x/∂p)<sub>h</sub> of the vapour fraction in 1/Pa; NaN in a single-phase state. */
    public double vapourFractionByPressureAtEnthalpy;
    /** The phase region. */
    public Phase phase = Phase.GAS;

    private @Nullable StatePoint liquidSide;
    private @Nullable StatePoint vapourSide;
    private @Nullable BracketedNewton innerSearch;
    private @Nullable BracketedNewton outerSearch;

    /** Creates an empty point. */
    public StatePoint() {}

    /**
     * {@return a work area for saturated liquid, made on the first call and kept}
     *
     * <p>After a flash whose result is two-phase it holds the liquid; otherwise its content has no meaning.
     */
    public StatePoint liquidSide() {
        StatePoint side = liquidSide;
        if (side == null) {
            side = new StatePoint();
            liquidSide = side;
        }
        return side;
    }

    /**
     * {@return a work area for saturated vapour, made on the first call and kept}
     *
     * <p>After a flash whose result is two-phase it holds the vapour; otherwise its content has no meaning.
     */
    public StatePoint vapourSide() {
        StatePoint side = vapourSide;
        if (side == null) {
            side = new StatePoint();
            vapourSide = side;
        }
        return side;
    }

    /** Lets go of the work areas, in a point that is kept for its values only. */
    void dropWorkAreas() {
        liquidSide = null;
        vapourSide = null;
        innerSearch = null;
        outerSearch = null;
    }

    /** {@return the search along one line, made on the first call and kept} */
    BracketedNewton innerSearch() {
        BracketedNewton search = innerSearch;
        if (search == null) {
            search = new BracketedNewton();
            innerSearch = search;
        }
        return search;
    }

    /** {@return the search that holds another one inside, made on the first call and kept} */
    BracketedNewton outerSearch() {
        BracketedNewton search = outerSearch;
        if (search == null) {
            search = new BracketedNewton();
            outerSearch = search;
        }
        return search;
    }

    /**
     * Fills the point with a single-phase state; the derivatives with pressure and enthalpy follow.
     *
     * @param temperature temperature in K
     * @param pressure absolute pressure in Pa
     * @param volume specific volume in m³/kg
     * @param enthalpy specific enthalpy in J/kg
     * @param entropy specific entropy in J/(kg K)
     * @param heatCapacity isobaric heat capacity in J/(kg K)
     * @param volumeByTemperature (∂v/∂T)<sub>p</sub> in m³/(kg K)
     * @param volumeByPressure (∂v/∂p)<sub>T</sub> in m³/(kg Pa)
     * @param phase the phase region
     */
    public void setSinglePhase(
            double temperature,
            double pressure,
            double volume,
            double enthalpy,
            double entropy,
            double heatCapacity,
            double volumeByTemperature,
            double volumeByPressure,
            Phase phase) {
        this.temperature = temperature;
        this.pressure = pressure;
        this.volume = volume;
        this.enthalpy = enthalpy;
        this.entropy = entropy;
        this.heatCapacity = heatCapacity;
        this.volumeByTemperature = volumeByTemperature;
        this.volumeByPressure = volumeByPressure;
        temperatureByEnthalpy = 1 / heatCapacity;
        // (∂h/∂p)T = v - T (∂v/∂T)p
        temperatureByPressureAtEnthalpy = (temperature * volumeByTemperature - volume) / heatCapacity;
        volumeByEnthalpy = volumeByTemperature / heatCapacity;
        volumeByPressureAtEnthalpy = volumeByPressure + volumeByTemperature * temperatureByPressureAtEnthalpy;
        vapourFraction = Double.NaN;
        vapourFractionByEnthalpy = Double.NaN;
        vapourFractionByPressureAtEnthalpy = Double.NaN;
        this.phase = phase;
    }

    /**
     * Fills the point with a mixture of saturated liquid and saturated vapour at the same temperature and pressure.
     *
     * <p>The slope of the saturation line follows from the two sides: dp/dT = (h″ − h′)/(T (v″ − v′))
     * (Clausius–Clapeyron).
     *
     * @param liquid saturated liquid, a single-phase point
     * @param vapour saturated vapour, a single-phase point at the same temperature and pressure
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     */
    public void setTwoPhase(StatePoint liquid, StatePoint vapour, double vapourFraction) {
        setTwoPhase(liquid, vapour, vapourFraction, Double.NaN);
    }

    /**
     * Fills the point with a mixture of saturated liquid and saturated vapour, on a saturation line with a slope of its own.
     *
     * @param liquid saturated liquid, a single-phase point
     * @param vapour saturated vapour, a single-phase point at the same temperature and pressure
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @param pressureByTemperature slope dp/dT of the saturation line in Pa/K; NaN for the one of Clausius and Clapeyron
     */
    public void setTwoPhase(StatePoint liquid, StatePoint vapour, double vapourFraction, double pressureByTemperature) {
        final double x = vapourFraction;
        final double t = liquid.temperature;
        final double dv = vapour.volume - liquid.volume;
        final double dh = vapour.enthalpy - liquid.enthalpy;
        temperature = t;
        pressure = liquid.pressure;
        volume = liquid.volume + x * dv;
        enthalpy = liquid.enthalpy + x * dh;
        entropy = liquid.entropy + x * (vapour.entropy - liquid.entropy);
        heatCapacity = Double.POSITIVE_INFINITY;
        volumeByTemperature = Double.NaN;
        volumeByPressure = Double.NaN;
        final double tByP = Double.isNaN(pressureByTemperature) ? t * dv / dh : 1 / pressureByTemperature;
        temperatureByEnthalpy = 0;
        temperatureByPressureAtEnthalpy = tByP;
        volumeByEnthalpy = dv / dh;
        // Along the saturation line: d/dp = (∂/∂p)T + (∂/∂T)p dT/dp.
        final double vLiquid = liquid.volumeByPressure + liquid.volumeByTemperature * tByP;
        final double vVapour = vapour.volumeByPressure + vapour.volumeByTemperature * tByP;
        final double hLiquid = liquid.volume - t * liquid.volumeByTemperature + liquid.heatCapacity * tByP;
        final double hVapour = vapour.volume - t * vapour.volumeByTemperature + vapour.heatCapacity * tByP;
        // v = v' + (h - h') dv/dh at constant h
        final double dvByP = vVapour - vLiquid;
        final double dhByP = hVapour - hLiquid;
        volumeByPressureAtEnthalpy = vLiquid + x * (dvByP - dv / dh * dhByP) - hLiquid * dv / dh;
        this.vapourFraction = x;
        // x = (h - h')/(h'' - h')
        vapourFractionByEnthalpy = 1 / dh;
        vapourFractionByPressureAtEnthalpy = -(hLiquid + x * dhByP) / dh;
        phase = Phase.TWO_PHASE;
    }

    /**
     * Copies another point into this one.
     *
     * @param other the point to copy
     */
    public void set(StatePoint other) {
        temperature = other.temperature;
        pressure = other.pressure;
        volume = other.volume;
        enthalpy = other.enthalpy;
        entropy = other.entropy;
        heatCapacity = other.heatCapacity;
        volumeByTemperature = other.volumeByTemperature;
        volumeByPressure = other.volumeByPressure;
        temperatureByEnthalpy = other.temperatureByEnthalpy;
        temperatureByPressureAtEnthalpy = other.temperatureByPressureAtEnthalpy;
        volumeByEnthalpy = other.volumeByEnthalpy;
        volumeByPressureAtEnthalpy = other.volumeByPressureAtEnthalpy;
        vapourFraction = other.vapourFraction;
        vapourFractionByEnthalpy = other.vapourFractionByEnthalpy;
        vapourFractionByPressureAtEnthalpy = other.vapourFractionByPressureAtEnthalpy;
        phase = other.phase;
    }

    /** {@return the specific internal energy u = h − p v in J/kg} */
    public double internalEnergy() {
        return enthalpy - pressure * volume;
    }

    /**
     * {@return the isochoric heat capacity in J/(kg K)}
     *
     * <p>In one phase cv = cp + T (∂v/∂T)²<sub>p</sub>/(∂v/∂p)<sub>T</sub>. In the two-phase region, which stays in
     * equilibrium, the same (∂u/∂T)<sub>v</sub> comes from the derivatives with pressure and enthalpy.
     */
    public double isochoricHeatCapacity() {
        if (phase == Phase.TWO_PHASE) {
            // at constant v: dh = -(v_p/v_h) dp; du = dh - v dp; dT = T_h dh + T_p dp
            return (volumeByPressureAtEnthalpy + volume * volumeByEnthalpy)
                    / (temperatureByEnthalpy * volumeByPressureAtEnthalpy
                            - temperatureByPressureAtEnthalpy * volumeByEnthalpy);
        }
        return volumeByTemperature == 0
                ? heatCapacity
                : heatCapacity + temperature * volumeByTemperature * volumeByTemperature / volumeByPressure;
    }

    /**
     * {@return the speed of sound in m/s: w² = −v²/(∂v/∂p)<sub>s</sub>}
     *
     * <p>In the two-phase region it is the one of a mixture that stays in equilibrium, far below those of its phases.
     */
    public double speedOfSound() {
        // (∂v/∂p)s = (∂v/∂p)h + v (∂v/∂h)p, from dh = v dp at constant s
        return volume / Math.sqrt(-(volumeByPressureAtEnthalpy + volume * volumeByEnthalpy));
    }
}
