package lostwork.fluid;

/** The pairs of properties that determine a state, for the checks that go through all of them. */
enum StatePair {
    TEMPERATURE_PRESSURE("(T,p)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atTemperaturePressure(asked.temperature, asked.pressure, out);
        }

        @Override
        boolean isTestedAt(StatePoint asked) {
            return asked.phase != Phase.TWO_PHASE;
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(temperature(asked, found), pressure(asked, found));
        }
    },
    PRESSURE_ENTHALPY("(p,h)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atPressureEnthalpy(asked.pressure, asked.enthalpy, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(pressure(asked, found), of(FlashProperty.ENTHALPY, asked, found));
        }
    },
    PRESSURE_ENTROPY("(p,s)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atPressureEntropy(asked.pressure, asked.entropy, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(pressure(asked, found), of(FlashProperty.ENTROPY, asked, found));
        }
    },
    PRESSURE_VOLUME("(p,v)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atPressureVolume(asked.pressure, asked.volume, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(pressure(asked, found), of(FlashProperty.VOLUME, asked, found));
        }
    },
    PRESSURE_VAPOUR_FRACTION("(p,x)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atPressureVapourFraction(asked.pressure, asked.vapourFraction, out);
        }

        @Override
        boolean isTestedAt(StatePoint asked) {
            return asked.phase == Phase.TWO_PHASE;
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(pressure(asked, found), Math.abs(asked.vapourFraction - found.vapourFraction));
        }
    },
    TEMPERATURE_VAPOUR_FRACTION("(T,x)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atTemperatureVapourFraction(asked.temperature, asked.vapourFraction, out);
        }

        @Override
        boolean isTestedAt(StatePoint asked) {
            return asked.phase == Phase.TWO_PHASE;
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(temperature(asked, found), Math.abs(asked.vapourFraction - found.vapourFraction));
        }
    },
    TEMPERATURE_ENTROPY("(T,s)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atTemperatureEntropy(asked.temperature, asked.entropy, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(temperature(asked, found), of(FlashProperty.ENTROPY, asked, found));
        }
    },
    TEMPERATURE_VOLUME("(T,v)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atTemperatureVolume(asked.temperature, asked.volume, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(temperature(asked, found), of(FlashProperty.VOLUME, asked, found));
        }
    },
    ENTHALPY_ENTROPY("(h,s)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atEnthalpyEntropy(asked.enthalpy, asked.entropy, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(of(FlashProperty.ENTHALPY, asked, found), of(FlashProperty.ENTROPY, asked, found));
        }
    },
    INTERNAL_ENERGY_VOLUME("(u,v)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atInternalEnergyVolume(asked.internalEnergy(), asked.volume, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(of(FlashProperty.INTERNAL_ENERGY, asked, found), of(FlashProperty.VOLUME, asked, found));
        }
    },
    ENTROPY_VOLUME("(s,v)") {
        @Override
        void find(FluidModel model, StatePoint asked, StatePoint out) {
            model.atEntropyVolume(asked.entropy, asked.volume, out);
        }

        @Override
        double deviation(StatePoint asked, StatePoint found) {
            return Math.max(of(FlashProperty.ENTROPY, asked, found), of(FlashProperty.VOLUME, asked, found));
        }
    };

    private final String words;

    StatePair(String words) {
        this.words = words;
    }

    /** Finds the state that has the pair of properties of another one. */
    abstract void find(FluidModel model, StatePoint asked, StatePoint out);

    /** {@return how far the found state is from the two properties asked for, relative} */
    abstract double deviation(StatePoint asked, StatePoint found);

    /** {@return whether the pair determines a state of this kind} */
    boolean isTestedAt(StatePoint asked) {
        return true;
    }

    static double of(FlashProperty property, StatePoint asked, StatePoint found) {
        final double value = property.of(asked);
        return Math.abs(property.of(found) - value)
                / Math.max(property.scale(value, asked), property.scale(value, found));
    }

    static double temperature(StatePoint asked, StatePoint found) {
        return Math.abs(found.temperature - asked.temperature) / asked.temperature;
    }

    static double pressure(StatePoint asked, StatePoint found) {
        return Math.abs(found.pressure - asked.pressure) / asked.pressure;
    }

    /** {@return the pair in symbols} */
    @Override
    public String toString() {
        return words;
    }
}
