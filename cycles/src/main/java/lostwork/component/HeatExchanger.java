package lostwork.component;

import java.util.List;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.FluidFunctionFactory;
import lostwork.plant.Inlet;
import lostwork.plant.MaterialPort;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Conductance;
import lostwork.quantity.Power;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;
import lostwork.quantity.TemperatureSpan;

/**
 * Two streams that exchange heat through a wall: recuperator, economiser, boiler, feedwater heater, condenser with a
 * coolant of its own.
 *
 * <p>What is known of an exchanger differs from task to task: a pinch in a design, temperatures in a test, the conductance
 * UA when one that stands is run otherwise. Each is a variable here, and any of them may be given in place of another. A
 * boiler with economiser, evaporator and superheater is one exchanger: the places where the water begins and ends to
 * boil are found inside.
 *
 * <h2>Equations</h2>
 *
 * <p>Along the exchanger the share z of the duty runs from 0 at the warm end, where the hot stream enters, to 1 at the cold
 * end, where it leaves. Enthalpy and pressure of each stream run linearly in z between its two ends, temperatures follow
 * from the fluids, and ΔT(z) is the temperature of the hot stream less that of the cold one.
 *
 * <pre>
 * energy balances       Q = m_hot (h_hot,in − h_hot,out) = m_cold (h_cold,out − h_cold,in)
 * warm end difference   ΔT(0)
 * cold end difference   ΔT(1)
 * pinch                 min ΔT(z)                                                  Linnhoff [1]
 * mean difference       1/Δm = ∫ dz / ΔT(z)
 * conductance           UA = Q / Δm = ∫ dQ / ΔT
 * effectiveness         ε = the larger of
 *                           (h_hot,in − h_hot,out) / (h_hot,in − h_hot(p_hot,out, T_cold,in))
 *                           (h_cold,out − h_cold,in) / (h_cold(p_cold,out, T_hot,in) − h_cold,in)
 * pressure losses       p_hot,in − p_hot,out,   p_cold,in − p_cold,out
 * </pre>
 *
 * <p>Units are SI; Q, the differences and UA count positive when heat passes from the hot to the cold stream. Only energy
 * balances hold flows: a pinch or an effectiveness says the same of a small exchanger and of a large one.
 *
 * <ul>
 *   <li>The pinch is the exact minimum: over both ends, over the kinks where a stream begins or ends to boil or condense, and
 *       over smooth minima between. It is not smoothed. Where the place of the minimum jumps, its derivative does too.
 *   <li>UA takes the heat transfer coefficient as the same everywhere. With constant heat capacities Δm is the logarithmic mean
 *       of the differences at the ends, and ε is that of the tables of Kays and London [2] and of Incropera and DeWitt [3].
 *   <li>ε compares with the duty at which one stream would leave at the temperature at which the other enters, also where a
 *       pinch inside forbids it: a boiler has its closest approach inside, and an effectiveness below 1 there.
 *       In parallel flow ε stays below 1 too.
 *   <li>A stream that stays two-phase up to an end holds that end's temperature whatever its enthalpy; differences there
 *       then do not determine the duty, and the solve says so.
 *   <li>Two of these values may be met by two exchangers (a pinch and a mean difference, for one); the one found is a
 *       solution, and a further given value chooses.
 * </ul>
 *
 * <p>Assumed: no heat loss to the surroundings, and no pressure loss of either stream unless one is given. A solution in
 * which the streams cross is an error that names the exchanger and the end, or says that it happens between the ends.
 * A conductance so large that the closest approach falls below 1e-12 K, from some 33 transfer units (1 − C) on, cannot be
 * resolved and is refused; give a difference or the effectiveness instead.
 *
 * <p>In exergy the hot stream spends and the cold one gains, as above the temperature of the surroundings.
 *
 * <pre>{@code
 * var boiler = b.add(new HeatExchanger("boiler"));
 * b.line(gas, boiler.hotSide(), stack);
 * ...
 * .given(boiler.pinch(), kelvins(12)).given(boiler.coldOutlet().superheat(), kelvins(60))     // design: the flow comes out
 * .given(boiler.conductance(), kilowattsPerKelvin(310))                                     // the same boiler, run otherwise
 * }</pre>
 *
 * <p>[1] B. Linnhoff, E. Hindmarsh, The pinch design method for heat exchanger networks, Chem. Eng. Sci. 38 (1983) 745–763.
 * [2] W. M. Kays, A. L. London, Compact Heat Exchangers, McGraw-Hill, chapter 2. [3] F. P. Incropera, D. P. DeWitt,
 * Fundamentals of Heat and Mass Transfer, Wiley, chapter on heat exchangers.
 */
public final class HeatExchanger extends Component {
    static final TemperatureSpan NO_DIFFERENCE = TemperatureSpan.kelvins(0);
    static final TemperatureSpan LARGEST_DIFFERENCE = TemperatureSpan.kelvins(10_000);

    private final FlowArrangement arrangement;
    private final Inlet hotInlet = inlet("hot inlet");
    private final Outlet hotOutlet = outlet("hot outlet");
    private final Inlet coldInlet = inlet("cold inlet");
    private final Outlet coldOutlet = outlet("cold outlet");
    private final FlowPath hotSide = new Way(hotInlet, hotOutlet);
    private final FlowPath coldSide = new Way(coldInlet, coldOutlet);
    private final Variable<Power> duty = variable("duty", Power.KIND);
    private final Variable<TemperatureSpan> warmEndDifference =
            variable("warm end difference", NO_DIFFERENCE, LARGEST_DIFFERENCE);
    private final Variable<TemperatureSpan> coldEndDifference =
            variable("cold end difference", NO_DIFFERENCE, LARGEST_DIFFERENCE);
    private final Variable<TemperatureSpan> pinch = variable("pinch", NO_DIFFERENCE, LARGEST_DIFFERENCE);
    private final Variable<TemperatureSpan> meanDifference =
            variable("mean difference", NO_DIFFERENCE, LARGEST_DIFFERENCE);
    private final Variable<Conductance> conductance = variable("conductance", Conductance.KIND);
    private final Variable<Ratio> effectiveness = variable("effectiveness", Ratio.percent(0), Ratio.percent(100));
    private final Variable<PressureDifference> hotPressureLoss = variable("hot pressure loss", PressureDifference.KIND);
    private final Variable<PressureDifference> coldPressureLoss =
            variable("cold pressure loss", PressureDifference.KIND);

    /**
     * Creates an exchanger in counterflow.
     *
     * @param name its name
     */
    public HeatExchanger(String name) {
        this(name, FlowArrangement.COUNTERFLOW);
    }

    /**
     * Creates an exchanger.
     *
     * @param name its name
     * @param arrangement how the streams run past each other
     */
    public HeatExchanger(String name, FlowArrangement arrangement) {
        super(name);
        this.arrangement = arrangement;
    }

    /** {@return how the streams run past each other} */
    public FlowArrangement arrangement() {
        return arrangement;
    }

    /** {@return where the hot stream enters} */
    public Inlet hotInlet() {
        return hotInlet;
    }

    /** {@return where the hot stream leaves} */
    public Outlet hotOutlet() {
        return hotOutlet;
    }

    /** {@return where the cold stream enters} */
    public Inlet coldInlet() {
        return coldInlet;
    }

    /** {@return where the cold stream leaves} */
    public Outlet coldOutlet() {
        return coldOutlet;
    }

    /** {@return the way of the hot stream, for lines and circuits} */
    public FlowPath hotSide() {
        return hotSide;
    }

    /** {@return the way of the cold stream, for lines and circuits} */
    public FlowPath coldSide() {
        return coldSide;
    }

    /** {@return the heat rate from the hot to the cold stream} */
    public Variable<Power> duty() {
        return duty;
    }

    /** {@return the temperature of the hot stream less that of the cold one, at the end where the hot stream enters} */
    public Variable<TemperatureSpan> warmEndDifference() {
        return warmEndDifference;
    }

    /** {@return the temperature of the hot stream less that of the cold one, at the end where the hot stream leaves} */
    public Variable<TemperatureSpan> coldEndDifference() {
        return coldEndDifference;
    }

    /** {@return the smallest temperature difference between the streams, anywhere along the exchanger, 0 K or more} */
    public Variable<TemperatureSpan> pinch() {
        return pinch;
    }

    /** {@return duty over conductance; with constant heat capacities the logarithmic mean of the end differences} */
    public Variable<TemperatureSpan> meanDifference() {
        return meanDifference;
    }

    /** {@return the conductance UA: heat transfer coefficient times area, taken as the same everywhere} */
    public Variable<Conductance> conductance() {
        return conductance;
    }

    /** {@return the duty over the one at which a stream would reach the inlet temperature of the other; 0 to 100 %} */
    public Variable<Ratio> effectiveness() {
        return effectiveness;
    }

    /** {@return pressure at inlet less that at outlet of the hot stream; none is assumed unless something else is given} */
    public Variable<PressureDifference> hotPressureLoss() {
        return hotPressureLoss;
    }

    /** {@return pressure at inlet less that at outlet of the cold stream; none is assumed unless something else is given} */
    public Variable<PressureDifference> coldPressureLoss() {
        return coldPressureLoss;
    }

    /** {@return the exergy that the hot stream gives up as fuel, the rise of exergy of the cold stream as product} */
    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuelDrop(hotInlet, hotOutlet).withProductRise(coldInlet, coldOutlet);
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(hotInlet, hotOutlet);
        e.sameFlow(coldInlet, coldOutlet);
        final Expression hotFall = hotInlet.enthalpy().minus(hotOutlet.enthalpy());
        final Expression coldRise = coldOutlet.enthalpy().minus(coldInlet.enthalpy());
        e.law("energy balance of the hot side", duty, hotInlet.flow().times(hotFall));
        e.law("energy balance of the cold side", duty, coldInlet.flow().times(coldRise));
        e.define("hot pressure loss", hotPressureLoss, hotInlet.pressure().minus(hotOutlet.pressure()));
        e.define("cold pressure loss", coldPressureLoss, coldInlet.pressure().minus(coldOutlet.pressure()));
        e.assume("no pressure loss of the hot stream", hotInlet.pressure(), hotOutlet.pressure());
        e.assume("no pressure loss of the cold stream", coldInlet.pressure(), coldOutlet.pressure());

        final boolean counterflow = arrangement == FlowArrangement.COUNTERFLOW;
        final Expression warmEnd = hotInlet.temperature().minus((counterflow ? coldOutlet : coldInlet).temperature());
        final Expression coldEnd = hotOutlet.temperature().minus((counterflow ? coldInlet : coldOutlet).temperature());
        e.define("warm end difference", warmEndDifference, warmEnd);
        e.define("cold end difference", coldEndDifference, coldEnd);
        e.define("pinch", pinch, profile(e, "smallest difference", SmallestDifference::new));
        final Expression mean = profile(e, "mean difference", MeanDifference::new);
        e.define("mean difference", meanDifference, mean);
        e.define("conductance", conductance, conductance.times(mean), duty);
        e.define("effectiveness", effectiveness, shareOfLargestDuty(e, hotFall, coldRise));
        e.require("the hot stream gives off heat", hotFall);
        e.require("the hot stream is not colder than the cold one at the warm end", warmEnd);
        e.require("the hot stream is not colder than the cold one at the cold end", coldEnd);
        e.require(
                "the hot stream is not colder than the cold one between the ends",
                profile(e, "smallest difference between the ends", InnerDifference::new));
    }

    private Expression profile(Equations e, String words, FluidFunctionFactory function) {
        final MaterialPort cold0 = arrangement == FlowArrangement.COUNTERFLOW ? coldOutlet : coldInlet;
        final MaterialPort cold1 = arrangement == FlowArrangement.COUNTERFLOW ? coldInlet : coldOutlet;
        return e.function(
                words,
                TemperatureSpan.KIND.dimension(),
                List.of(hotInlet, coldInlet),
                function,
                List.of(
                        hotInlet.pressure(),
                        hotInlet.enthalpy(),
                        hotOutlet.pressure(),
                        hotOutlet.enthalpy(),
                        cold0.pressure(),
                        cold0.enthalpy(),
                        cold1.pressure(),
                        cold1.enthalpy()));
    }

    /**
     * The change of enthalpy of each stream over the one that would bring it to the inlet temperature of the other; the
     * larger of the two. Written without flows: a stream of no flow is no solution.
     */
    private Expression shareOfLargestDuty(Equations e, Expression hotFall, Expression coldRise) {
        final Expression hotLimit = hotOutlet.enthalpyAtTemperature(hotOutlet.pressure(), coldInlet.temperature());
        final Expression coldLimit = coldOutlet.enthalpyAtTemperature(coldOutlet.pressure(), hotInlet.temperature());
        return e.function(
                "larger",
                Ratio.KIND.dimension(),
                List.of(),
                fluids -> new Larger(),
                List.of(
                        hotFall.over(hotInlet.enthalpy().minus(hotLimit)),
                        coldRise.over(coldLimit.minus(coldInlet.enthalpy()))));
    }
}
