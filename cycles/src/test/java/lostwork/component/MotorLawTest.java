package lostwork.component;

import java.util.SplittableRandom;
import lostwork.plant.Plant;
import lostwork.quantity.Power;

/** The contract of components, for motor. */
class MotorLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var motor = new Motor("motor");
        final var b = Plant.builder("motor set");
        b.add(motor);
        final double shaft = between(random, 0.01, 20);
        return new Case(
                motor,
                b.build()
                        .specify()
                        .given(motor.shaft().power(), Power.megawatts(shaft))
                        .given(motor.power(), Power.megawatts(shaft / between(random, 0.8, 0.99))));
    }
}
