package lostwork.examples.audit;

import java.util.List;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/** What a stream consists of, as the survey states it. */
sealed interface Medium {
    /** {@return the name in reports} */
    String label();

    /** {@return whether the medium may hold water vapour, so that a gas volume needs "wet" or "dry"} */
    boolean mayHoldVapour();

    /** Air without water vapour. */
    record DryAir() implements Medium {
        @Override
        public String label() {
            return "dry air";
        }

        @Override
        public boolean mayHoldVapour() {
            return false;
        }
    }

    /**
     * Air with water vapour.
     *
     * @param humidity how much vapour
     */
    record HumidAir(Humidity humidity) implements Medium {
        @Override
        public String label() {
            return "humid air";
        }

        @Override
        public boolean mayHoldVapour() {
            return true;
        }
    }

    /** The humidity of air. */
    sealed interface Humidity {}

    /**
     * Vapour pressure as a share of the saturation pressure.
     *
     * @param share the relative humidity, 0 to 100 %
     * @param temperature the temperature that it holds for, at the pressure of the stream
     */
    record RelativeHumidity(Ratio share, Temperature temperature) implements Humidity {}

    /**
     * Mass of vapour per mass of dry air.
     *
     * @param vapourPerDryAir the humidity ratio
     */
    record HumidityRatio(Ratio vapourPerDryAir) implements Humidity {}

    /**
     * Products of the complete combustion of a fuel with air.
     *
     * @param fuel the fuel
     * @param air how much air
     */
    record FlueGas(SurveyFuel fuel, AirSupply air) implements Medium {
        @Override
        public String label() {
            return fuel.label() + " flue gas";
        }

        @Override
        public boolean mayHoldVapour() {
            return true;
        }
    }

    /** The air of a combustion. */
    sealed interface AirSupply {}

    /**
     * Air beyond what complete combustion needs.
     *
     * @param share excess over the stoichiometric air
     */
    record ExcessAir(Ratio share) implements AirSupply {}

    /**
     * Oxygen as an analyser shows it.
     *
     * @param share mole share of oxygen
     * @param basis whether the analyser counts the water vapour
     */
    record MeasuredOxygen(Ratio share, MoistureBasis basis) implements AirSupply {}

    /**
     * A gas of stated composition.
     *
     * @param components the components, in the order of the survey; the shares sum to one
     */
    record GasMixture(List<Component> components) implements Medium {
        public GasMixture {
            components = List.copyOf(components);
        }

        @Override
        public String label() {
            return "gas mixture";
        }

        @Override
        public boolean mayHoldVapour() {
            return components.stream().anyMatch(c -> c.gas() == SurveyGas.H2O);
        }
    }

    /**
     * One gas of a mixture.
     *
     * @param gas the gas
     * @param share its mole share
     */
    record Component(SurveyGas gas, Ratio share) {}

    /** Liquid water. */
    record LiquidWater() implements Medium {
        @Override
        public String label() {
            return "water";
        }

        @Override
        public boolean mayHoldVapour() {
            return false;
        }
    }
}
