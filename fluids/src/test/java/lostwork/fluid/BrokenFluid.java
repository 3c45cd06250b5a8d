package lostwork.fluid;

import java.util.function.Consumer;

/** A consistent fluid with one thing broken on purpose. */
final class BrokenFluid implements FluidModel {
    private final FluidModel whole = new TwoPhaseExample();
    private final Consumer<StatePoint> damage;

    BrokenFluid(Consumer<StatePoint> damage) {
        this.damage = damage;
    }

    @Override
    public String name() {
        return "broken fluid";
    }

    @Override
    public double molarMass() {
        return whole.molarMass();
    }

    @Override
    public FluidRange range() {
        return whole.range();
    }

    @Override
    public Provenance provenance() {
        return whole.provenance();
    }

    @Override
    public SaturationModel saturation() {
        return whole.saturation();
    }

    @Override
    public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
        whole.evaluate(temperature, pressure, side, out);
        damage.accept(out);
    }
}
