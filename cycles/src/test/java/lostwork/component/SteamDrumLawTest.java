package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.quantity.Power;

/** The contract of components, for steamdrum. */
class SteamDrumLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        return draw(random, 2, 120);
    }

    private static Case draw(SplittableRandom random, double lowestBar, double highestBar) {
        final var b = Plant.builder("drum boiler");
        final var feed = b.add(new Supply("feedwater", Water.industrial()));
        final var drum = b.add(new SteamDrum("drum"));
        final var evaporator = b.add(new Heater("evaporator"));
        final var steam = b.add(new Discharge("steam"));
        b.connect(feed.outlet(), drum.feed())
                .connect(drum.downcomer(), evaporator.inlet())
                .connect(evaporator.outlet(), drum.riser())
                .connect(drum.steam(), steam.inlet());
        return new Case(
                drum,
                b.build()
                        .specify()
                        .given(steam.pressure(), bar(between(random, lowestBar, highestBar)))
                        .given(feed.temperature(), celsius(between(random, 60, 115)))
                        .given(evaporator.duty(), Power.megawatts(between(random, 1, 50)))
                        .given(drum.riser().flow(), kilogramsPerSecond(between(random, 200, 500))));
    }

    /** Up to about 30 bar the enthalpy of saturated steam rises with pressure; above, one flow belongs to two pressures. */
    @Override
    Case drawSmooth(SplittableRandom random) {
        return draw(random, 2, 12);
    }
}
