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

/** Two streams that exchange heat through a wall. */
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

    /** {@return the smallest temperature difference between the streams, anywhere along the exchanger} */
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

    /** {@return the duty over the largest one that the inlet temperatures allow} */
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
        return ExergyPurpose.dissipative().withFuelDrop(hotInlet, hotOutlet).withProductRise(coldInlet, coldOutlet);
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
