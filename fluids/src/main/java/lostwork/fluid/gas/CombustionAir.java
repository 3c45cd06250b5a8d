package lostwork.fluid.gas;

import java.util.Locale;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Ratio;

/**
 * How much air a fuel burns with, and which air: an excess, or the oxygen that was measured in the flue gas.
 *
 * <p>The factories are made for static import: {@code FlueGas.of(fuel, excessAir(percent(18)))},
 * {@code FlueGas.of(fuel, oxygenInDryGas(percent(3)).from(humidAir))}. The air is dry air unless {@link #from} says
 * otherwise. Immutable and thread-safe.
 */
public final class CombustionAir {
    private enum Basis {
        EXCESS,
        OXYGEN_IN_DRY_GAS,
        OXYGEN_IN_WET_GAS
    }

    private final Basis basis;
    private final double value;
    private final IdealGas air;

    private CombustionAir(Basis basis, double value, IdealGas air) {
        this.basis = basis;
        this.value = value;
        this.air = air;
    }

    /**
     * {@return dry air in excess of what complete combustion takes}
     *
     * @param excess the excess over the stoichiometric air, not negative; 18 % means 1.18 times the stoichiometric air
     * @throws OutOfRangeException if the excess is negative
     */
    public static CombustionAir excessAir(Ratio excess) {
        if (!(excess.si() >= 0 && excess.si() <= 1e3)) {
            throw new OutOfRangeException(
                    "excess air",
                    excess.si(),
                    0,
                    1e3,
                    "1",
                    "complete combustion",
                    "with less air than the fuel takes, the flue gas holds carbon monoxide and hydrogen");
        }
        return new CombustionAir(Basis.EXCESS, excess.si(), DryAir.standard());
    }

    /** {@return just the dry air that complete combustion takes} */
    public static CombustionAir stoichiometric() {
        return excessAir(Ratio.fraction(0));
    }

    /**
     * {@return the air that leaves a mole fraction of oxygen in the flue gas, measured after its water was taken out}
     *
     * @param oxygen mole fraction of oxygen in the dry flue gas, from 0 to less than in the air
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static CombustionAir oxygenInDryGas(Ratio oxygen) {
        return new CombustionAir(Basis.OXYGEN_IN_DRY_GAS, share(oxygen), DryAir.standard());
    }

    /**
     * {@return the air that leaves a mole fraction of oxygen in the flue gas, measured with its water}
     *
     * @param oxygen mole fraction of oxygen in the wet flue gas, from 0 to less than in the air
     * @throws OutOfRangeException if the fraction is outside 0 to 1
     */
    public static CombustionAir oxygenInWetGas(Ratio oxygen) {
        return new CombustionAir(Basis.OXYGEN_IN_WET_GAS, share(oxygen), DryAir.standard());
    }

    /**
     * {@return the same amount of another air: humid, or enriched with oxygen}
     *
     * @param other the air, which holds oxygen and nothing that burns
     * @throws IllegalArgumentException if it holds no oxygen, or something that burns
     */
    public CombustionAir from(IdealGas other) {
        final GasComposition composition = other.composition();
        if (!(composition.fraction(Species.O2) > 0)) {
            throw new IllegalArgumentException(other + " holds no oxygen");
        }
        for (Species species : composition.species()) {
            if (!FlueGas.passesUnchanged(species)) {
                throw new IllegalArgumentException(
                        other + " holds " + species.name() + ", which would not pass a flame unchanged");
            }
        }
        return new CombustionAir(basis, value, other);
    }

    /** {@return the air} */
    public IdealGas air() {
        return air;
    }

    /** {@return the excess over the stoichiometric air for a fuel, as a number} */
    double excessFor(Fuel fuel) {
        if (basis == Basis.EXCESS) {
            return value;
        }
        final boolean wet = basis == Basis.OXYGEN_IN_WET_GAS;
        final GasComposition composition = air.composition();
        final double oxygen = composition.fraction(Species.O2);
        final double counted = wet ? 1 : 1 - composition.fraction(Species.H2O);
        final double least = fuel.oxygenDemand() / oxygen;
        // Moles of flue gas that count, per kg of fuel, without excess.
        final double stoichiometric = FlueGas.burntMoles(fuel, wet) + least * (counted - oxygen);
        final double limit = oxygen / counted;
        if (!(value < limit)) {
            throw new OutOfRangeException(
                    wet ? "oxygen in the wet flue gas" : "oxygen in the dry flue gas",
                    value,
                    0,
                    limit,
                    "1",
                    "the flue gas holds less oxygen than its air",
                    "");
        }
        // value = e least oxygen / (stoichiometric + e least counted), solved for e
        return value * stoichiometric / (least * (oxygen - value * counted));
    }

    private static double share(Ratio oxygen) {
        if (!(oxygen.si() >= 0 && oxygen.si() <= 1)) {
            throw new OutOfRangeException("oxygen in the flue gas", oxygen.si(), 0, 1, "1", "a mole fraction", "");
        }
        return oxygen.si();
    }

    /** {@return how much of which air, in words} */
    @Override
    public String toString() {
        final String words = switch (basis) {
            case EXCESS -> "excess air";
            case OXYGEN_IN_DRY_GAS -> "oxygen in the dry flue gas";
            case OXYGEN_IN_WET_GAS -> "oxygen in the wet flue gas";
        };
        return String.format(
                Locale.ROOT, "%s %.4g %% (%s)", words, 100 * value, air.model().name());
    }
}
