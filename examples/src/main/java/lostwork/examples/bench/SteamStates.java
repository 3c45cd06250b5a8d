package lostwork.examples.bench;

import java.util.SplittableRandom;
import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.fluid.water.Water;

/** States of water, seeded, that lie in one region of IAPWS-IF97 each. */
public enum SteamStates {
    /** Liquid: region 1. */
    LIQUID_1 {
        @Override
        void draw(FluidModel water, SplittableRandom random, StatePoint out) {
            final double temperature = between(random, 280, 620);
            final double least = saturationPressure(water, temperature);
            water.atTemperaturePressure(temperature, between(random, 1.01 * least, 80e6), out);
        }
    },
    /** Vapour: region 2. */
    VAPOUR_2 {
        @Override
        void draw(FluidModel water, SplittableRandom random, StatePoint out) {
            final double temperature = between(random, 380, 1070);
            // 16 MPa lies below the boundary to region 3 at every temperature.
            final double most = temperature < 620 ? 0.99 * saturationPressure(water, temperature) : 16e6;
            water.atTemperaturePressure(temperature, Math.exp(between(random, Math.log(5e3), Math.log(most))), out);
        }
    },
    /** Dense fluid about the critical point: region 3. */
    DENSE_3 {
        @Override
        void draw(FluidModel water, SplittableRandom random, StatePoint out) {
            // The boundary to region 2 is at 30.5 MPa for 700 K.
            water.atTemperaturePressure(between(random, 630, 700), between(random, 31e6, 80e6), out);
        }
    },
    /** Liquid and vapour together: region 4. */
    WET_4 {
        @Override
        void draw(FluidModel water, SplittableRandom random, StatePoint out) {
            final double pressure = Math.exp(between(random, Math.log(2e3), Math.log(16e6)));
            water.atPressureVapourFraction(pressure, between(random, 0.02, 0.98), out);
        }
    },
    /** Hot steam: region 5. */
    HOT_5 {
        @Override
        void draw(FluidModel water, SplittableRandom random, StatePoint out) {
            final double pressure = Math.exp(between(random, Math.log(1e4), Math.log(49e6)));
            water.atTemperaturePressure(between(random, 1080, 2260), pressure, out);
        }
    };

    /** Takes a running number to the index of a state. */
    static final int MASK = 63;

    private static final long SEED = 20261201L;

    abstract void draw(FluidModel water, SplittableRandom random, StatePoint out);

    /** {@return states drawn at random, the same in every run} */
    StatePoint[] points() {
        final FluidModel water = Water.industrial().model();
        final SplittableRandom random = new SplittableRandom(SEED);
        final StatePoint[] points = new StatePoint[MASK + 1];
        for (int k = 0; k < points.length; k++) {
            points[k] = new StatePoint();
            draw(water, random, points[k]);
        }
        return points;
    }

    /** {@return volume, enthalpy and entropy as one number of about equal parts} */
    static double oneNumber(double volume, double enthalpy, double entropy) {
        return volume * 1e7 + enthalpy + entropy * 1e3;
    }

    private static double between(SplittableRandom random, double low, double high) {
        return low + random.nextDouble() * (high - low);
    }

    private static double saturationPressure(FluidModel water, double temperature) {
        final var saturation = water.saturation();
        if (saturation == null) {
            throw new IllegalStateException("water without saturation");
        }
        return saturation.pressure(temperature);
    }
}
