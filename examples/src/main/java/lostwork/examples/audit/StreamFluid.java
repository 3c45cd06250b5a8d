package lostwork.examples.audit;

import java.util.Optional;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidState;
import lostwork.fluid.Phase;
import lostwork.fluid.gas.CombustionAir;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.GasComposition;
import lostwork.fluid.gas.HumidAir;
import lostwork.fluid.gas.IdealGas;
import lostwork.fluid.gas.Species;
import lostwork.fluid.water.Water;
import lostwork.quantity.MassFlow;
import lostwork.quantity.MolarFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;

/** The property model behind a medium of the survey. */
final class StreamFluid {
    private final Fluid fluid;
    private final String label;
    private final Ratio vapourShare;

    private StreamFluid(Fluid fluid, String label, Ratio vapourShare) {
        this.fluid = fluid;
        this.label = label;
        this.vapourShare = vapourShare;
    }

    /**
     * {@return the model of a stream}
     *
     * @param stream the stream; its pressure is the one that a relative humidity holds for
     * @param site the site, whose air burns the fuels
     */
    static StreamFluid of(SurveyLine stream, Site site) {
        final Medium medium = stream.medium();
        if (medium instanceof Medium.LiquidWater) {
            return new StreamFluid(Water.industrial(), medium.label(), Ratio.fraction(0));
        }
        if (medium instanceof Medium.DryAir) {
            return gas(DryAir.standard(), medium.label());
        }
        if (medium instanceof Medium.HumidAir air) {
            final HumidAir gas = humidAir(air.humidity(), stream.pressure());
            final double gramPerKilogram = 1000 * gas.humidityRatio().inFraction();
            return gas(gas, medium.label() + ", " + Decimals.fixed(gramPerKilogram, 1) + " g/kg");
        }
        if (medium instanceof Medium.FlueGas burnt) {
            final FlueGas gas =
                    FlueGas.of(burnt.fuel().make(), combustionAir(burnt.air()).from(siteAir(site)));
            final double airRatio = 1 + gas.excessAir().inFraction();
            return gas(gas, medium.label() + ", air " + Decimals.fixed(airRatio, 2));
        }
        return gas(IdealGas.of(composition((Medium.GasMixture) medium)), medium.label());
    }

    private static StreamFluid gas(IdealGas gas, String label) {
        return new StreamFluid(gas, label, gas.composition().moleFraction(Species.H2O));
    }

    private static HumidAir siteAir(Site site) {
        return HumidAir.of(site.ambientTemperature(), site.ambientPressure(), site.relativeHumidity());
    }

    private static HumidAir humidAir(Medium.Humidity humidity, Pressure pressure) {
        if (humidity instanceof Medium.RelativeHumidity relative) {
            return HumidAir.of(relative.temperature(), pressure, relative.share());
        }
        return HumidAir.ofHumidityRatio(((Medium.HumidityRatio) humidity).vapourPerDryAir());
    }

    private static CombustionAir combustionAir(Medium.AirSupply air) {
        if (air instanceof Medium.ExcessAir excess) {
            return CombustionAir.excessAir(excess.share());
        }
        final Medium.MeasuredOxygen oxygen = (Medium.MeasuredOxygen) air;
        return switch (oxygen.basis()) {
            case WET -> CombustionAir.oxygenInWetGas(oxygen.share());
            case DRY -> CombustionAir.oxygenInDryGas(oxygen.share());
        };
    }

    private static GasComposition composition(Medium.GasMixture mixture) {
        final GasComposition.Builder composition = GasComposition.byMole();
        for (Medium.Component component : mixture.components()) {
            composition.add(Species.of(component.gas().formula()), component.share());
        }
        return composition.buildNormalised();
    }

    Fluid fluid() {
        return fluid;
    }

    /** {@return the medium in words, with what the model found about it} */
    String label() {
        return label;
    }

    /**
     * {@return the state of the stream as it leaves}
     *
     * @param stream the stream
     * @throws CellRefusedException if water is not liquid there
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    FluidState supplyState(SurveyLine stream) {
        final FluidState supply = fluid.state(stream.supply(), stream.pressure());
        if (stream.medium() instanceof Medium.LiquidWater && supply.phase() != Phase.LIQUID) {
            final Temperature boiling = fluid.saturation(stream.pressure()).temperature();
            throw new CellRefusedException(
                    "water at " + stream.supply() + " and " + stream.pressure() + " is not liquid: it boils at "
                            + Decimals.fixed(boiling.inCelsius(), 1) + " °C",
                    "liquid water: a lower supply temperature or a higher pressure");
        }
        return supply;
    }

    /** {@return the mass flow of the stream, water vapour included} */
    MassFlow massFlow(SurveyFlow flow, FluidState supply) {
        if (flow instanceof SurveyFlow.ByMass byMass) {
            return byMass.flow();
        }
        if (flow instanceof SurveyFlow.ByVolume byVolume) {
            return byVolume.flow().over(supply.volume());
        }
        final SurveyFlow.ByNormalVolume normal = (SurveyFlow.ByNormalVolume) flow;
        final boolean dry = normal.basis().filter(MoistureBasis.DRY::equals).isPresent();
        final double wetPerCounted = dry ? 1 / (1 - vapourShare.inFraction()) : 1;
        return MolarFlow.molesPerSecond(normal.flow().inMolesPerSecond() * wetPerCounted)
                .times(fluid.molarMass());
    }

    /**
     * {@return the temperature at which water begins to condense from the gas; empty for liquid water and for gas without
     * vapour}
     *
     * @param pressure the absolute pressure of the gas
     */
    Optional<Temperature> waterDewPoint(Pressure pressure) {
        return vapourShare.si() > 0 && fluid instanceof IdealGas gas
                ? Optional.of(gas.waterDewPoint(pressure))
                : Optional.empty();
    }
}
