package lostwork.component;

import java.util.List;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Ratio;

/**
 * The drum of a circulation boiler: feedwater enters, saturated steam leaves, saturated water goes down to the evaporator
 * and comes back wet through the riser.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * mass balance       ṁ_feed + ṁ_riser = ṁ_steam + ṁ_downcomer
 * energy balance     Σ ṁ h of feed and riser = Σ ṁ h of steam and downcomer
 * steam              h = h(p, x = 1)
 * downcomer          h = h(p, x = 0)
 * drum pressure      p_downcomer = p_steam
 * assumed            p_feed = p_steam
 * circulation ratio  ṁ_riser / ṁ_steam
 * </pre>
 *
 * <p>It is adiabatic. The pressure of the riser follows from the evaporator, which the downcomer feeds at drum pressure; a
 * riser pressure below that of the drum is refused. The circulation ratio is computed when it is given or read; with
 * forced or natural circulation one value of the loop must be given: the ratio, the flow, or the vapour fraction of the
 * riser. There is no blowdown; a {@link Splitter} in the downcomer takes one off.
 *
 * <p>Source: the first law of an adiabatic open system without work; the circulation ratio as in every textbook on steam
 * boilers.
 */
public final class SteamDrum extends Component {
    private final Inlet feed = inlet("feed");
    private final Inlet riser = inlet("riser");
    private final Outlet steam = outlet("steam");
    private final Outlet downcomer = outlet("downcomer");
    private final Variable<Ratio> circulationRatio = variable("circulation ratio", Ratio.KIND);

    /**
     * Creates a steam drum.
     *
     * @param name its name
     */
    public SteamDrum(String name) {
        super(name);
    }

    /** {@return where the feedwater enters} */
    public Inlet feed() {
        return feed;
    }

    /** {@return where the wet steam comes back from the evaporator} */
    public Inlet riser() {
        return riser;
    }

    /** {@return where the saturated steam leaves} */
    public Outlet steam() {
        return steam;
    }

    /** {@return where the saturated water leaves to the evaporator} */
    public Outlet downcomer() {
        return downcomer;
    }

    /** {@return the mass flow of the riser over that of the steam} */
    public Variable<Ratio> circulationRatio() {
        return circulationRatio;
    }

    /** {@return the way from feedwater to steam, for a line or a circuit} */
    public FlowPath steamPath() {
        return new Way(feed, steam);
    }

    @Override
    protected void describe(Equations e) {
        for (Outlet outlet : List.of(steam, downcomer)) {
            e.sameFluid(feed, outlet);
            e.sameFluid(riser, outlet);
        }
        e.massBalance(List.of(feed, riser), List.of(steam, downcomer));
        e.law(
                "energy balance",
                feed.flow().times(feed.enthalpy()).plus(riser.flow().times(riser.enthalpy())),
                steam.flow().times(steam.enthalpy()).plus(downcomer.flow().times(downcomer.enthalpy())));
        e.model("saturated steam", steam.enthalpy(), steam.saturatedEnthalpy(steam.pressure(), Expression.number(1)));
        e.model(
                "saturated water",
                downcomer.enthalpy(),
                downcomer.saturatedEnthalpy(downcomer.pressure(), Expression.number(0)));
        e.law("drum pressure", downcomer.pressure(), steam.pressure());
        e.assume("feed at drum pressure", feed.pressure(), steam.pressure());
        e.define("circulation ratio", circulationRatio, circulationRatio.times(steam.flow()), riser.flow());
        e.require(
                "a riser at drum pressure or above",
                riser.pressure().over(steam.pressure()).minus(Expression.number(1)));
    }
}
