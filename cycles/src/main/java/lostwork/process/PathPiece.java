package lostwork.process;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.StatePoint;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/**
 * A smooth piece of a reversible path: within one phase, or within the two-phase region.
 *
 * <p>Each kind has a coordinate along which it is smooth and in which the state is found with the least work. Integrals
 * are taken by parts where that leaves a variable of the coordinate under the integral, as in
 * {@code ∫ p dv = [p v] − ∫ v dp}: a small jump of a model at a region border is then counted with the pressure at which it
 * happens, and no derivative is needed.
 */
abstract class PathPiece {
    final Fluid fluid;
    final FluidState first;
    final FluidState last;

    private PathPiece(FluidState first, FluidState last) {
        fluid = first.fluid();
        this.first = first;
        this.last = last;
    }

    /** {@return the coordinate at the first state} */
    abstract double begin();

    /** {@return the coordinate at the last state} */
    abstract double end();

    /** {@return the state at a coordinate} */
    abstract FluidState at(double coordinate);

    /** {@return ∫ p dv in J/kg} */
    abstract double pressureVolumeArea();

    /** {@return ∫ T ds in J/kg} */
    abstract double temperatureEntropyArea();

    final double energyScale() {
        return first.pressure().si() * first.volume().si()
                + last.pressure().si() * last.volume().si();
    }

    final double heatScale() {
        return Math.abs(entropyChange()) * last.temperature().si() + energyScale();
    }

    final double entropyChange() {
        return last.entropy().si() - first.entropy().si();
    }

    /** {@return ∫ p dv with the logarithm of the pressure as the coordinate} */
    final double areaOverPressure() {
        final double ends = last.pressure().si() * last.volume().si()
                - first.pressure().si() * first.volume().si();
        return ends
                - PathIntegral.of(
                        "work along a path",
                        logPressure ->
                                Math.exp(logPressure) * at(logPressure).volume().si(),
                        begin(),
                        end(),
                        energyScale());
    }

    /** {@return ∫ T ds with the temperature as the coordinate; entropies count from the first state} */
    final double areaOverTemperature() {
        final double datum = first.entropy().si();
        return last.temperature().si() * entropyChange()
                - PathIntegral.of(
                        "heat along a path", kelvin -> at(kelvin).entropy().si() - datum, begin(), end(), heatScale());
    }

    /** Constant temperature, one phase; the coordinate is ln p. */
    static final class Isotherm extends PathPiece {
        Isotherm(FluidState first, FluidState last) {
            super(first, last);
        }

        @Override
        double begin() {
            return Math.log(first.pressure().si());
        }

        @Override
        double end() {
            return Math.log(last.pressure().si());
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(first.temperature(), Pressure.pascal(Math.exp(coordinate)));
        }

        @Override
        double pressureVolumeArea() {
            return areaOverPressure();
        }

        @Override
        double temperatureEntropyArea() {
            return first.temperature().si() * entropyChange();
        }
    }

    /** Evaporation or condensation at constant temperature and pressure; the coordinate is the vapour fraction. */
    static final class Boiling extends PathPiece {
        Boiling(FluidState first, FluidState last) {
            super(first, last);
        }

        @Override
        double begin() {
            return fraction(first);
        }

        @Override
        double end() {
            return fraction(last);
        }

        private static double fraction(FluidState state) {
            return state.vapourFraction().orElseThrow().si();
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(first.pressure(), Ratio.fraction(coordinate));
        }

        @Override
        double pressureVolumeArea() {
            return first.pressure().si() * (last.volume().si() - first.volume().si());
        }

        @Override
        double temperatureEntropyArea() {
            return first.temperature().si() * entropyChange();
        }
    }

    /** Constant pressure, one phase; the coordinate is the temperature. */
    static final class Isobar extends PathPiece {
        Isobar(FluidState first, FluidState last) {
            super(first, last);
        }

        @Override
        double begin() {
            return first.temperature().si();
        }

        @Override
        double end() {
            return last.temperature().si();
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(Temperature.kelvin(coordinate), first.pressure());
        }

        @Override
        double pressureVolumeArea() {
            return first.pressure().si() * (last.volume().si() - first.volume().si());
        }

        @Override
        double temperatureEntropyArea() {
            return areaOverTemperature();
        }
    }

    /** Constant volume; the coordinate is the temperature. */
    static final class Isochore extends PathPiece {
        Isochore(FluidState first, FluidState last) {
            super(first, last);
        }

        @Override
        double begin() {
            return first.temperature().si();
        }

        @Override
        double end() {
            return last.temperature().si();
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(Temperature.kelvin(coordinate), first.volume());
        }

        @Override
        double pressureVolumeArea() {
            return 0;
        }

        @Override
        double temperatureEntropyArea() {
            return areaOverTemperature();
        }
    }

    /** Constant entropy; the coordinate is ln p. */
    static final class Isentrope extends PathPiece {
        private final SpecificEntropy entropy;

        Isentrope(FluidState first, FluidState last) {
            super(first, last);
            entropy = first.entropy();
        }

        @Override
        double begin() {
            return Math.log(first.pressure().si());
        }

        @Override
        double end() {
            return Math.log(last.pressure().si());
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(Pressure.pascal(Math.exp(coordinate)), entropy);
        }

        @Override
        double pressureVolumeArea() {
            return areaOverPressure();
        }

        @Override
        double temperatureEntropyArea() {
            return 0;
        }
    }

    /** Constant p vⁿ; the coordinate is ln v. */
    static final class Polytrope extends PathPiece {
        private final double exponent;

        Polytrope(FluidState first, FluidState last, double exponent) {
            super(first, last);
            this.exponent = exponent;
        }

        @Override
        double begin() {
            return Math.log(first.volume().si());
        }

        @Override
        double end() {
            return Math.log(last.volume().si());
        }

        private double pressure(double logVolume) {
            return first.pressure().si() * Math.exp(exponent * (begin() - logVolume));
        }

        @Override
        FluidState at(double coordinate) {
            return fluid.state(
                    Pressure.pascal(pressure(coordinate)), SpecificVolume.cubicMetresPerKilogram(Math.exp(coordinate)));
        }

        @Override
        double pressureVolumeArea() {
            return PathIntegral.of(
                    "work along a path",
                    logVolume -> pressure(logVolume) * Math.exp(logVolume),
                    begin(),
                    end(),
                    energyScale());
        }

        @Override
        double temperatureEntropyArea() {
            // [T s] − ∫ s dT, with dT/d ln v from the exact derivatives of the state.
            final double datum = first.entropy().si();
            return last.temperature().si() * entropyChange()
                    - PathIntegral.of(
                            "heat along a path",
                            logVolume -> {
                                final FluidState state = at(logVolume);
                                return (state.entropy().si() - datum) * temperatureByLogVolume(state);
                            },
                            begin(),
                            end(),
                            heatScale());
        }

        private double temperatureByLogVolume(FluidState state) {
            final StatePoint point = new StatePoint();
            state.copyTo(point);
            // dT = T_h dh + T_p dp
            return point.temperatureByEnthalpy * enthalpyByLogVolume(point)
                    - point.temperatureByPressureAtEnthalpy * exponent * point.pressure;
        }

        /** {@return the heat per mass and logarithm of the volume in J/kg: dq = dh − v dp with dp = −n p d ln v} */
        double heatByLogVolume(FluidState state) {
            final StatePoint point = new StatePoint();
            state.copyTo(point);
            return enthalpyByLogVolume(point) + point.volume * exponent * point.pressure;
        }

        /** Along the path dv = v d ln v and dp = −n p d ln v; dv = v_h dh + v_p dp gives dh. */
        private double enthalpyByLogVolume(StatePoint point) {
            return (point.volume + point.volumeByPressureAtEnthalpy * exponent * point.pressure)
                    / point.volumeByEnthalpy;
        }
    }
}
