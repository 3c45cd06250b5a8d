package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.FlowPath;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Conductance;
import lostwork.quantity.PressureDifference;
import org.junit.jupiter.api.Test;

/** The contract of components, for one that a user writes with the public interface alone. */
class OwnComponentLawTest extends ComponentContract {
    /** A hot pipe that loses heat to the surroundings: Q̇ = UA (T₂ − T₀), as if the pipe were mixed at its outlet state. */
    static final class HotPipe extends Component implements FlowPath {
        private final Inlet inlet = inlet("inlet");
        private final Outlet outlet = outlet("outlet");
        private final HeatOutlet loss = heatOutlet("loss");
        private final Variable<Conductance> conductance = variable("conductance", Conductance.KIND);
        private final Variable<PressureDifference> friction = variable("friction", PressureDifference.KIND);

        HotPipe(String name) {
            super(name);
        }

        @Override
        public Inlet inlet() {
            return inlet;
        }

        @Override
        public Outlet outlet() {
            return outlet;
        }

        @Override
        protected void describe(Equations e) {
            e.sameFlow(inlet, outlet);
            e.law(
                    "energy balance",
                    loss.rate(),
                    inlet.flow().times(inlet.enthalpy().minus(outlet.enthalpy())));
            e.model(
                    "heat loss",
                    loss.rate(),
                    conductance.times(outlet.temperature().minus(loss.temperature())));
            e.law("friction", friction, inlet.pressure().minus(outlet.pressure()));
            e.assume("no friction", friction, PressureDifference.pascals(0));
            e.require(
                    "a pipe warmer than its surroundings", outlet.temperature().minus(loss.temperature()));
        }
    }

    @Override
    Case draw(SplittableRandom random) {
        final var pipe = new HotPipe("pipe");
        return new Case(
                pipe,
                Line.of(pipe, Line.anyGas(random), bar(between(random, 2, 15)), random)
                        .given(pipe.inlet().temperature(), celsius(between(random, 300, 500)))
                        .given(pipe.loss.temperature(), celsius(between(random, -10, 35)))
                        .given(pipe.friction, PressureDifference.bars(between(random, 0.05, 0.5)))
                        .given(pipe.outlet().temperature(), celsius(between(random, 270, 299))));
    }

    /** By hand: ṁ cp (T₁ − T₂) = UA (T₂ − T₀), T₂ = (ṁ cp T₁ + UA T₀) / (ṁ cp + UA). */
    @Test
    void agreesWithTheHandCalculation() {
        final var pipe = new HotPipe("pipe");
        final var s = Line.of(pipe, TestGas.COLD_AIR, bar(3), new SplittableRandom(5))
                .given(pipe.inlet().temperature(), celsius(200))
                .given(pipe.loss.temperature(), celsius(20))
                .given(pipe.conductance, Conductance.wattsPerKelvin(500))
                .solve();
        final double capacity = s.value(pipe.inlet().flow()).si() * TestGas.HEAT_CAPACITY;
        assertEquals(
                (capacity * 200 + 500 * 20) / (capacity + 500),
                s.value(pipe.outlet().temperature()).inCelsius(),
                1e-8);
        assertEquals(1, s.plan().assumptions().size());
    }
}
