package lostwork.fluid;

/** A law that every property model keeps; {@link FluidCheck} tests them. */
public enum FluidLaw {
    /** An evaluation returns the temperature and pressure that it was asked for, and only finite numbers. */
    EVALUATION("an evaluation returns the temperature and pressure asked for, and finite numbers"),
    /** cp = (∂h/∂T)<sub>p</sub>: the heat capacity is the slope of the enthalpy. */
    HEAT_CAPACITY("cp = (∂h/∂T)p"),
    /** (∂s/∂T)<sub>p</sub> = cp/T, from T ds = dh at constant pressure. */
    ENTROPY_BY_TEMPERATURE("(∂s/∂T)p = cp/T"),
    /** (∂h/∂p)<sub>T</sub> = v − T (∂v/∂T)<sub>p</sub>: enthalpy is u + p v of the same fluid. */
    ENTHALPY_BY_PRESSURE("(∂h/∂p)T = v - T (∂v/∂T)p"),
    /** (∂s/∂p)<sub>T</sub> = −(∂v/∂T)<sub>p</sub>, a Maxwell relation. */
    ENTROPY_BY_PRESSURE("(∂s/∂p)T = -(∂v/∂T)p"),
    /** The stated (∂v/∂T)<sub>p</sub> is the slope of the volume. */
    VOLUME_BY_TEMPERATURE("the stated (∂v/∂T)p is the slope of the volume"),
    /** The stated (∂v/∂p)<sub>T</sub> is the slope of the volume. */
    VOLUME_BY_PRESSURE("the stated (∂v/∂p)T is the slope of the volume"),
    /** Thermal stability: cv above 0. */
    THERMAL_STABILITY("cv > 0"),
    /** Mechanical stability: volume does not rise with pressure. */
    MECHANICAL_STABILITY("(∂v/∂p)T <= 0"),
    /** The properties have no jumps but at the saturation line. */
    CONTINUITY("no jumps away from the saturation line"),
    /** Liquid and vapour in equilibrium have equal Gibbs energies. */
    EQUAL_GIBBS_ENERGY("h' - T s' = h'' - T s'' on the saturation line"),
    /** The slope of the saturation line is (h″ − h′)/(T (v″ − v′)) (Clausius–Clapeyron). */
    CLAUSIUS_CLAPEYRON("dp/dT = (h'' - h')/(T (v'' - v')) on the saturation line"),
    /** The stated slope of the saturation line is the slope of its pressure. */
    SATURATION_SLOPE("the stated dp/dT is the slope of the saturation pressure"),
    /** The saturation temperature of a saturation pressure is the temperature one began with. */
    SATURATION_INVERSE("T(p(T)) = T on the saturation line"),
    /** A state found from a pair of properties has these two properties. */
    FLASH("a state found from two properties has these two properties");

    private final String words;

    FluidLaw(String words) {
        this.words = words;
    }

    /** {@return the law in words} */
    @Override
    public String toString() {
        return words;
    }
}
