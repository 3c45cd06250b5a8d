package lostwork.examples.recovery;

import java.util.List;
import lostwork.component.Compressor;
import lostwork.component.Discharge;
import lostwork.component.Generator;
import lostwork.component.HeatExchanger;
import lostwork.component.Motor;
import lostwork.component.Pump;
import lostwork.component.Supply;
import lostwork.component.Turbine;
import lostwork.fluid.Fluid;
import lostwork.fluid.water.Water;
import lostwork.ledger.BoundaryMarks;
import lostwork.ledger.BoundaryRole;
import lostwork.plant.Outlet;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import lostwork.plant.SolveOptions;
import lostwork.plant.Specification;
import lostwork.plant.Variable;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import org.jspecify.annotations.Nullable;

/**
 * A steam Rankine plant on a stream of hot gas, with a boiler in which economiser, evaporator and superheater are one
 * counterflow exchanger, and with the fans that gas and condenser need.
 *
 * <p>At a given evaporation pressure the steam flow is the largest one that keeps both the pinch of the boiler and the
 * lowest temperature of the gas. Solves start from the previous solution, so an instance is for one thread.
 */
public final class RecoveryPlant {
    private final HotGas gas;
    private final RecoveryDesign design;

    private final Supply supply;
    private final HeatExchanger boiler = new HeatExchanger("boiler");
    private final Compressor draughtFan = new Compressor("draught fan");
    private final Discharge stack = new Discharge("stack");
    private final Turbine turbine = new Turbine("turbine");
    private final AirCooledCondenser condenser = new AirCooledCondenser("condenser");
    private final Pump pump = new Pump("feed pump");
    private final Generator generator = new Generator("generator");
    private final Motor pumpMotor = new Motor("pump motor");
    private final Motor fanMotor = new Motor("fan motor");
    private final Variable<Power> netPower;

    private final Specification atPinch;
    private final Specification atLowestGas;
    private @Nullable Solution last;

    /**
     * Builds the plant.
     *
     * @param gas the gas
     * @param ambient the temperature of the ambient air
     * @param design the assumptions
     * @param size the class of turbine and generator
     */
    RecoveryPlant(HotGas gas, Temperature ambient, RecoveryDesign design, MachineSize size) {
        this.gas = gas;
        this.design = design;
        supply = new Supply("gas supply", gas.fluid());
        final Plant.Builder b = Plant.builder("steam plant on " + gas.name());
        b.add(supply);
        b.add(boiler);
        b.add(draughtFan);
        b.add(stack);
        b.add(turbine);
        b.add(condenser);
        b.add(pump);
        b.add(generator);
        b.add(pumpMotor);
        b.add(fanMotor);
        b.connect(supply.outlet(), boiler.hotInlet());
        b.connect(boiler.hotOutlet(), draughtFan.inlet());
        b.connect(draughtFan.outlet(), stack.inlet());
        b.circuit(Water.industrial(), boiler.coldSide(), turbine, condenser, pump);
        b.connect(turbine.shaft(), generator.shaft());
        b.connect(pumpMotor.shaft(), pump.shaft());
        b.connect(fanMotor.shaft(), draughtFan.shaft());
        netPower = b.define(
                "net power",
                Power.KIND,
                generator
                        .power()
                        .minus(pumpMotor.power())
                        .minus(fanMotor.power())
                        .minus(condenser.fans().power()));
        final Specification common = specify(b.build(), condensing(ambient, design), size);
        final Pressure start = design.lowestPressure().value();
        final Specification open = common.given(evaporationPressure(), start);
        atPinch = open.given(boiler.pinch(), design.pinch().value());
        atLowestGas = open.given(gasOutlet(), gas.lowest());
    }

    private Specification specify(Plant plant, Temperature condensing, MachineSize size) {
        Specification s = plant.specify()
                .given(supply.flow(), gas.flow())
                .given(supply.temperature(), gas.supply())
                .given(supply.pressure(), gas.pressure())
                .given(boiler.hotPressureLoss(), design.gasPressureLoss().value())
                .given(stack.pressure(), gas.pressure())
                .given(
                        draughtFan.isentropicEfficiency(),
                        design.draughtFanEfficiency().value())
                .given(turbine.isentropicEfficiency(), size.turbineEfficiency().value())
                .given(generator.efficiency(), size.generatorEfficiency().value())
                .given(condenser.fanShare(), design.condenserFanShare().value())
                .given(
                        condenser.outlet().pressure(),
                        Water.industrial().saturation(condensing).pressure())
                .given(
                        condenser.outlet().subcooling(),
                        design.condensateSubcooling().value())
                .given(pump.isentropicEfficiency(), design.pumpEfficiency().value())
                .given(pumpMotor.efficiency(), design.motorEfficiency().value())
                .given(fanMotor.efficiency(), design.motorEfficiency().value());
        return steamIsLimitedByTheGas()
                ? s.given(
                        boiler.warmEndDifference(), design.superheaterApproach().value())
                : s.given(turbine.inlet().temperature(), steamTemperature());
    }

    private static Temperature condensing(Temperature ambient, RecoveryDesign design) {
        final Temperature byAir = ambient.plus(design.condenserApproach().value());
        final Temperature lowest = design.lowestCondensingTemperature().value();
        return byAir.compareTo(lowest) >= 0 ? byAir : lowest;
    }

    // ---------------------------------------------------------------------------------------------- solving

    /**
     * {@return the plant at an evaporation pressure, with as much steam as the limits of the gas allow}
     *
     * @param pressure the pressure
     * @throws lostwork.plant.PlantSolveException if there is no such plant
     */
    OperatingPoint at(Pressure pressure) {
        final Solution pinched = solve(atPinch.with(evaporationPressure(), pressure));
        if (pinched.value(gasOutlet()).compareTo(gas.lowest()) >= 0) {
            return new OperatingPoint(this, pinched, Limit.PINCH);
        }
        return new OperatingPoint(
                this, solve(atLowestGas.with(evaporationPressure(), pressure)), Limit.LOWEST_GAS_TEMPERATURE);
    }

    /**
     * {@return the plant at the evaporation pressure at which the pinch and the lowest gas temperature limit it together}
     *
     * @param near a point nearby
     * @throws lostwork.plant.PlantSolveException if there is no such pressure
     */
    OperatingPoint atBothLimits(OperatingPoint near) {
        last = near.solution();
        final Specification both = atPinch.release(evaporationPressure()).given(gasOutlet(), gas.lowest());
        return new OperatingPoint(this, solve(both), Limit.BOTH);
    }

    /**
     * {@return the evaporation pressure at which the steam leaves the turbine with a share of vapour}
     *
     * @param vapourFraction the share of vapour
     * @throws lostwork.plant.PlantSolveException if there is no such pressure
     */
    Pressure pressureForOutlet(Ratio vapourFraction) {
        final Specification wet =
                atPinch.release(evaporationPressure()).given(turbine.outlet().vapourFraction(), vapourFraction);
        return solve(wet).value(evaporationPressure());
    }

    private Solution solve(Specification specification) {
        final SolveOptions options = SolveOptions.defaults();
        final Solution solution = specification.solve(last == null ? options : options.startingFrom(last));
        last = solution;
        return solution;
    }

    // ---------------------------------------------------------------------------------------------- what it is made of

    /** {@return the gas} */
    public HotGas gas() {
        return gas;
    }

    /** {@return the temperature of the steam at the turbine inlet} */
    Temperature steamTemperature() {
        final Temperature byGas =
                gas.supply().minus(design.superheaterApproach().value());
        final Temperature highest = design.highestSteamTemperature().value();
        return byGas.compareTo(highest) <= 0 ? byGas : highest;
    }

    boolean steamIsLimitedByTheGas() {
        return steamTemperature().compareTo(design.highestSteamTemperature().value()) < 0;
    }

    /** {@return the working fluid} */
    Fluid water() {
        return Water.industrial();
    }

    /** {@return what flows across the boundary are to the owner: the drop of the gas is fuel, the net power product} */
    BoundaryMarks marks() {
        return BoundaryMarks.byDirection()
                .with(stack.inlet(), BoundaryRole.FUEL)
                .with(pumpMotor.wire(), BoundaryRole.PRODUCT)
                .with(fanMotor.wire(), BoundaryRole.PRODUCT)
                .with(condenser.fans(), BoundaryRole.PRODUCT);
    }

    /**
     * A stream of the plant.
     *
     * @param words where it flows
     * @param outlet the port that it comes from
     */
    public record Stream(String words, Outlet outlet) {}

    /** {@return the streams of the plant: the gas, then the water from the feed pump on} */
    public List<Stream> streams() {
        return List.of(
                new Stream("gas to boiler", supply.outlet()),
                new Stream("gas to draught fan", boiler.hotOutlet()),
                new Stream("gas to stack", draughtFan.outlet()),
                new Stream("water to boiler", pump.outlet()),
                new Stream("steam to turbine", boiler.coldOutlet()),
                new Stream("steam to condenser", turbine.outlet()),
                new Stream("water to feed pump", condenser.outlet()));
    }

    /** {@return the pressure at which the water boils} */
    public Variable<Pressure> evaporationPressure() {
        return turbine.inlet().pressure();
    }

    /** {@return the temperature with which the gas leaves the boiler} */
    public Variable<Temperature> gasOutlet() {
        return boiler.hotOutlet().temperature();
    }

    /** {@return the temperature with which the gas comes} */
    public Variable<Temperature> gasInlet() {
        return supply.temperature();
    }

    /** {@return the mass flow of the gas} */
    public Variable<MassFlow> gasFlow() {
        return supply.flow();
    }

    /** {@return the power of the generator less what motors and fans take} */
    public Variable<Power> netPower() {
        return netPower;
    }

    /** {@return the boiler} */
    public HeatExchanger boiler() {
        return boiler;
    }

    /** {@return the turbine} */
    public Turbine turbine() {
        return turbine;
    }

    /** {@return the condenser} */
    public AirCooledCondenser condenser() {
        return condenser;
    }

    /** {@return the feed pump} */
    public Pump pump() {
        return pump;
    }

    /** {@return the fan that makes up for the pressure loss of the gas} */
    public Compressor draughtFan() {
        return draughtFan;
    }

    /** {@return the generator} */
    public Generator generator() {
        return generator;
    }

    /** {@return the motor of the feed pump} */
    public Motor pumpMotor() {
        return pumpMotor;
    }

    /** {@return the motor of the draught fan} */
    public Motor fanMotor() {
        return fanMotor;
    }

    /** {@return where the gas leaves} */
    public Discharge stack() {
        return stack;
    }
}
