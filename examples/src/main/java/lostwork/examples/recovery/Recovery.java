package lostwork.examples.recovery;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntConsumer;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.ledger.Ledger;
import lostwork.plant.Sensitivities;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.TemperatureSpan;

/** The recovery plant of a stream at its best evaporation pressure, with its exergy ledger. Immutable. */
public final class Recovery {
    /** A net power this close to the one at a bound of the search is said to be held by the bound. */
    private static final double AT_BOUND = 1e-3;

    /** Thinner gas needs a boiler and a fan of another kind. */
    private static final double LEAST_PRESSURE_OVER_LOSS = 10;

    private final HotGas gas;
    private final RecoveryDesign design;
    private final MachineSize size;
    private final PressureSearch.Result search;
    private final Ledger ledger;

    private Recovery(HotGas gas, RecoveryDesign design, MachineSize size, PressureSearch.Result search, Ledger ledger) {
        this.gas = gas;
        this.design = design;
        this.size = size;
        this.search = search;
        this.ledger = ledger;
    }

    /**
     * {@return the recovery plant of a stream}
     *
     * @param gas the stream
     * @param ambient the surroundings
     * @param design the assumptions
     * @param progress takes how many pressures were tried
     * @throws NoRecoveryException if there is none; the message says why
     * @throws lostwork.plant.PlantSolveException if the plant cannot be solved
     */
    public static Recovery of(HotGas gas, ReferenceEnvironment ambient, RecoveryDesign design, IntConsumer progress) {
        requireHot(gas, ambient, design);
        MachineSize size = MachineSize.of(gas.expectedWork());
        while (true) {
            final RecoveryPlant plant = new RecoveryPlant(gas, ambient.temperature(), design, size);
            final PressureSearch.Result search = new PressureSearch(plant, design, progress::accept).run();
            final OperatingPoint best = search.best();
            final MachineSize found =
                    MachineSize.of(best.solution().value(plant.turbine().power()));
            // Only ever to a smaller class, so this ends.
            if (found.compareTo(size) < 0) {
                size = found;
                continue;
            }
            requireWorthwhile(best, design);
            final Ledger ledger = Ledger.of(best.solution(), ambient, plant.marks());
            return new Recovery(gas, design, size, search, ledger);
        }
    }

    private static void requireHot(HotGas gas, ReferenceEnvironment ambient, RecoveryDesign design) {
        if (gas.supply().compareTo(design.lowestGasTemperature().value()) < 0) {
            throw new NoRecoveryException("the gas comes with " + gas.supply() + ", colder than the "
                    + design.lowestGasTemperature().value() + " from which a steam plant is reasonable");
        }
        if (gas.lowest().compareTo(gas.supply()) >= 0) {
            throw new NoRecoveryException("the gas must not be cooled below its supply temperature");
        }
        if (gas.pressure().si()
                < LEAST_PRESSURE_OVER_LOSS * design.gasPressureLoss().value().si()) {
            throw new NoRecoveryException("the gas is at " + gas.pressure() + ", too thin for a boiler that takes "
                    + design.gasPressureLoss().text() + " of its pressure");
        }
        if (gas.expectedWork().compareTo(design.smallestPlant().value()) < 0) {
            throw new NoRecoveryException("the gas is likely to give " + text(gas.expectedWork()) + ", less than the "
                    + text(design.smallestPlant().value()) + " of the smallest plant worth a look");
        }
        if (!(ambient.temperature().compareTo(gas.supply()) < 0)) {
            throw new NoRecoveryException("the gas is not warmer than the ambient");
        }
    }

    private static void requireWorthwhile(OperatingPoint best, RecoveryDesign design) {
        if (best.netPower().compareTo(design.smallestPlant().value()) < 0) {
            throw new NoRecoveryException("the best plant would give " + text(best.netPower()) + " net, less than the "
                    + text(design.smallestPlant().value()) + " of the smallest plant worth a look");
        }
    }

    private static String text(Power power) {
        return power.format(lostwork.quantity.Units.KILOWATT, 3);
    }

    /** {@return the gas} */
    public HotGas gas() {
        return gas;
    }

    /** {@return the assumptions} */
    public List<Assumption<?>> assumptions() {
        final List<Assumption<?>> all = new ArrayList<>(design.assumptions());
        all.add(size.turbineEfficiency());
        all.add(size.generatorEfficiency());
        return all;
    }

    /** {@return the plant at its best pressure} */
    public OperatingPoint best() {
        return search.best();
    }

    /** {@return some of the pressures that were tried and the best one, by rising pressure} */
    public List<OperatingPoint> points() {
        return search.scanned();
    }

    /** {@return how many pressures were tried} */
    public int evaluations() {
        return search.evaluations();
    }

    /** {@return the exergy ledger of the plant: the exergy that the gas gives up is the fuel, the net power the product} */
    public Ledger ledger() {
        return ledger;
    }

    /** {@return the net electric power} */
    public Power netPower() {
        return best().netPower();
    }

    /**
     * {@return how far the net power may be off when flow and temperature of the gas are measured with some uncertainty}
     *
     * <p>{@code sqrt((dP/dm um)² + (dP/dT uT)²)} with the exact derivatives of the solved plant; what is given of the
     * plant is held.
     *
     * @param flow relative uncertainty of the flow
     * @param temperature uncertainty of the supply temperature
     */
    public Power uncertainty(Ratio flow, TemperatureSpan temperature) {
        final RecoveryPlant plant = best().plant();
        final Sensitivities slopes = best().solution().sensitivities(plant.netPower());
        final double byFlow = slopes.to(plant.gasFlow()).si() * gas.flow().si() * flow.si();
        final double byTemperature = slopes.to(plant.gasInlet()).si() * temperature.si();
        return Power.watts(Math.hypot(byFlow, byTemperature));
    }

    /** {@return what limits the plant, in sentences} */
    public List<String> findings() {
        final List<String> findings = new ArrayList<>();
        findings.add(coolingLimit());
        findings.add(pressureLimit());
        findings.addAll(ledger.notes());
        return findings;
    }

    private String coolingLimit() {
        final String gasLeaves = rounded(best().gasOutlet().inCelsius(), 0) + " °C";
        return switch (best().limit()) {
            case PINCH ->
                "The pinch of " + design.pinch().value() + " limits the cooling: the gas leaves the boiler at "
                        + gasLeaves + ", above its lowest allowed " + gas.lowest() + ".";
            case LOWEST_GAS_TEMPERATURE ->
                "The lowest allowed gas temperature of " + gas.lowest()
                        + " limits the cooling; the pinch is then "
                        + rounded(best().pinch().inKelvins(), 1) + " K, more than the "
                        + design.pinch().value() + " that the boiler could do.";
            case BOTH ->
                "At this pressure pinch (" + design.pinch().value() + ") and lowest allowed gas temperature ("
                        + gas.lowest()
                        + ") limit the cooling together. At a higher pressure the pinch would leave the gas"
                        + " hotter, at a lower one the steam would do less work.";
        };
    }

    private String pressureLimit() {
        final String pressure = rounded(best().pressure().inBar(), 1) + " bar";
        if (isAt(search.highest())) {
            return switch (search.upperBound()) {
                case DESIGN ->
                    "The highest evaporation pressure of the assumptions, " + pressure
                            + ", binds: more pressure would give more power.";
                case SUPERHEAT ->
                    "At " + pressure + " the steam is superheated by the least "
                            + design.leastSuperheat().value() + ": the gas is too cold for more pressure.";
                case WETNESS ->
                    "The moisture limit binds: above " + pressure + " less than "
                            + design.lowestVapourFraction().value()
                            + " of the steam would leave the turbine as vapour.";
            };
        }
        if (isAt(search.lowest())) {
            return "The lowest evaporation pressure of the assumptions, " + pressure + ", binds.";
        }
        return "The best pressure lies inside its limits, "
                + rounded(search.lowest().inBar(), 1) + " bar to "
                + rounded(search.highest().inBar(), 1) + " bar; the moisture limit does not bind.";
    }

    private boolean isAt(Pressure bound) {
        return Math.abs(Math.log(best().pressure().si() / bound.si())) < AT_BOUND;
    }

    private static String rounded(double value, int digits) {
        return new java.math.BigDecimal(value)
                .setScale(digits, java.math.RoundingMode.HALF_EVEN)
                .toPlainString();
    }
}
