package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import lostwork.fluid.FluidModel;
import lostwork.plant.kernel.CallSites;
import lostwork.plant.kernel.PropertyKind;
import lostwork.plant.kernel.Tape;
import org.jspecify.annotations.Nullable;

/**
 * The equations between the properties of one state. Pressure and enthalpy are the core pair; the form of the others
 * depends on what is given, since in the two-phase region temperature and pressure are no pair.
 */
final class Relations {
    /**
     * One relation.
     *
     * @param equation the equation, for its words and its formula
     * @param tape the equation, compiled
     * @param direct the same statement solved for the enthalpy, for the case that it alone settles it; null for none
     */
    record Relation(Equation equation, Tape tape, @Nullable Tape direct) {}

    private final Layout.StreamState state;
    private final FluidModel model;
    private final CallSites sites;
    private final List<Relation> relations = new ArrayList<>();

    private Relations(Layout.StreamState state, CallSites sites) {
        this.state = state;
        this.model = state.model();
        this.sites = sites;
    }

    /**
     * {@return the relations of a state}
     *
     * @param state the state
     * @param active which slots of the plant take part
     * @param given which slots of the plant are given
     * @param sites takes the call sites
     */
    static List<Relation> of(Layout.StreamState state, boolean[] active, boolean[] given, CallSites sites) {
        final Relations r = new Relations(state, sites);
        r.collect(active, given);
        return r.relations;
    }

    private void collect(boolean[] active, boolean[] given) {
        final int x = state.slot(SlotRole.VAPOUR_FRACTION);
        final int superheat = state.slot(SlotRole.SUPERHEAT);
        final int subcooling = state.slot(SlotRole.SUBCOOLING);
        final int t = state.slot(SlotRole.TEMPERATURE);
        final boolean byFraction = given[x];
        final boolean bySuperheat = !byFraction && given[superheat];
        final boolean bySubcooling = !byFraction && !bySuperheat && given[subcooling];
        final MaterialPort port = state.port();
        final Expression p = port.pressure();
        final Expression h = port.enthalpy();
        final Expression saturation = port.saturationTemperature(p);
        if (byFraction) {
            add(
                    "enthalpy from vapour fraction",
                    h,
                    port.saturatedEnthalpy(p, port.vapourFraction()),
                    enthalpyFrom(PropertyKind.ENTHALPY_PX, x));
        } else if (bySuperheat) {
            add(
                    "enthalpy from superheat",
                    h,
                    port.enthalpyAtTemperature(p, saturation.plus(port.superheat())),
                    enthalpyFrom(PropertyKind.ENTHALPY_SUPERHEATED, superheat));
        } else if (bySubcooling) {
            add(
                    "enthalpy from subcooling",
                    h,
                    port.enthalpyAtTemperature(p, saturation.minus(port.subcooling())),
                    enthalpyFrom(PropertyKind.ENTHALPY_SUBCOOLED, subcooling));
        }
        if (active[t]) {
            if (byFraction) {
                add("saturation temperature", port.temperature(), saturation, saturated(t, -1, false));
            } else if (bySuperheat) {
                add(
                        "temperature from superheat",
                        port.temperature(),
                        saturation.plus(port.superheat()),
                        saturated(t, superheat, false));
            } else if (bySubcooling) {
                add(
                        "temperature from subcooling",
                        port.temperature(),
                        saturation.minus(port.subcooling()),
                        saturated(t, subcooling, true));
            } else {
                add(
                        "temperature of state",
                        port.temperature(),
                        port.temperatureAt(p, h),
                        of(PropertyKind.TEMPERATURE_PH, t),
                        enthalpyFrom(PropertyKind.ENTHALPY_PT, t));
            }
        }
        final int s = state.slot(SlotRole.ENTROPY);
        if (active[s]) {
            add(
                    "entropy of state",
                    port.entropy(),
                    property(FluidFunction.ENTROPY_OF_PRESSURE_AND_ENTHALPY),
                    of(PropertyKind.ENTROPY_PH, s),
                    enthalpyFrom(PropertyKind.ENTHALPY_PS, s));
        }
        final int v = state.slot(SlotRole.VOLUME);
        if (active[v]) {
            add(
                    "specific volume of state",
                    port.volume(),
                    property(FluidFunction.VOLUME_OF_PRESSURE_AND_ENTHALPY),
                    of(PropertyKind.VOLUME_PH, v));
        }
        if (active[x] && !byFraction) {
            add(
                    "vapour fraction of state",
                    port.vapourFraction(),
                    property(FluidFunction.VAPOUR_FRACTION_OF_PRESSURE_AND_ENTHALPY),
                    of(PropertyKind.VAPOUR_FRACTION_PH, x));
        }
        if (active[superheat] && !bySuperheat) {
            add(
                    "superheat of state",
                    port.superheat(),
                    port.temperatureAt(p, h).minus(saturation),
                    span(superheat, false));
        }
        if (active[subcooling] && !bySubcooling) {
            add(
                    "subcooling of state",
                    port.subcooling(),
                    saturation.minus(port.temperatureAt(p, h)),
                    span(subcooling, true));
        }
    }

    private Expression property(FluidFunction function) {
        final MaterialPort port = state.port();
        return new Expression.Property(function, port, List.of(port.pressure(), port.enthalpy()));
    }

    private void add(String words, Expression left, Expression right, Tape tape) {
        add(words, left, right, tape, null);
    }

    private void add(String words, Expression left, Expression right, Tape tape, @Nullable Tape direct) {
        final Equation equation = new Equation(state.port().toString(), words, EquationTag.LAW, left, right);
        relations.add(new Relation(equation, tape, direct));
    }

    /** y = f(p, h). */
    private Tape of(PropertyKind kind, int slot) {
        final Tape.Builder b = new Tape.Builder(sites);
        return b.build(b.slot(slot), ofState(b, kind));
    }

    private int ofState(Tape.Builder b, PropertyKind kind) {
        final int h = b.slot(state.slot(SlotRole.ENTHALPY));
        if (kind == PropertyKind.TEMPERATURE_PH && !model.enthalpyDependsOnPressure()) {
            return b.property(sites.property(model, kind), b.constant(anyPressure()), h);
        }
        return b.property(sites.ofState(model, kind, state.index()), b.slot(state.slot(SlotRole.PRESSURE)), h);
    }

    /** h = f(p, y). */
    private Tape enthalpyFrom(PropertyKind kind, int slot) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int p = kind == PropertyKind.ENTHALPY_PT && !model.enthalpyDependsOnPressure()
                ? b.constant(anyPressure())
                : b.slot(state.slot(SlotRole.PRESSURE));
        return b.build(b.slot(state.slot(SlotRole.ENTHALPY)), b.property(sites.property(model, kind), p, b.slot(slot)));
    }

    private double anyPressure() {
        return Math.sqrt(model.range().lowestPressure())
                * Math.sqrt(model.range().highestPressure());
    }

    /** T = Tsat(p), or T = Tsat(p) + superheat, or T = Tsat(p) − subcooling. */
    private Tape saturated(int temperature, int span, boolean below) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int saturation = saturation(b);
        final int right =
                span < 0 ? saturation : below ? b.minus(saturation, b.slot(span)) : b.plus(saturation, b.slot(span));
        return b.build(b.slot(temperature), right);
    }

    /** The span between the temperature of the state and saturation. */
    private Tape span(int slot, boolean below) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int t = ofState(b, PropertyKind.TEMPERATURE_PH);
        final int saturation = saturation(b);
        return b.build(b.slot(slot), below ? b.minus(saturation, t) : b.minus(t, saturation));
    }

    private int saturation(Tape.Builder b) {
        return b.property(
                sites.property(model, PropertyKind.SATURATION_TEMPERATURE_P),
                b.slot(state.slot(SlotRole.PRESSURE)),
                -1);
    }
}
