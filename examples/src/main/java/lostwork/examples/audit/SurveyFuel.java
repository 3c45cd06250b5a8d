package lostwork.examples.audit;

import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.GasComposition;
import lostwork.fluid.gas.Species;
import lostwork.quantity.Ratio;

/** The fuels that a survey may name. Typical compositions are common practice, no source. */
enum SurveyFuel {
    NATURAL_GAS("natural gas", "CH4 93 %, C2H6 4 %, N2 2 %, CO2 1 % by mole; a typical pipeline gas") {
        @Override
        Fuel make() {
            return Fuel.gas(
                    label(),
                    GasComposition.byMole()
                            .add(Species.of("CH4"), Ratio.percent(93))
                            .add(Species.of("C2H6"), Ratio.percent(4))
                            .add(Species.N2, Ratio.percent(2))
                            .add(Species.CO2, Ratio.percent(1))
                            .build());
        }
    },
    METHANE("methane", "CH4") {
        @Override
        Fuel make() {
            return pure("CH4");
        }
    },
    PROPANE("propane", "C3H8") {
        @Override
        Fuel make() {
            return pure("C3H8");
        }
    },
    HYDROGEN("hydrogen", "H2") {
        @Override
        Fuel make() {
            return pure("H2");
        }
    };

    private static final Vocabulary<SurveyFuel> NAMES = names();

    private final String label;
    private final String composition;

    SurveyFuel(String label, String composition) {
        this.label = label;
        this.composition = composition;
    }

    private static Vocabulary<SurveyFuel> names() {
        final Vocabulary<SurveyFuel> names = new Vocabulary<>("fuel");
        for (SurveyFuel fuel : values()) {
            names.with(fuel.label, fuel);
        }
        return names;
    }

    /** {@return the names that are understood} */
    static Vocabulary<SurveyFuel> vocabulary() {
        return NAMES;
    }

    /** {@return the fuel with its analysis} */
    abstract Fuel make();

    Fuel pure(String formula) {
        return Fuel.gas(label, GasComposition.pure(Species.of(formula)));
    }

    String label() {
        return label;
    }

    /** {@return the composition in words} */
    String composition() {
        return composition;
    }
}
