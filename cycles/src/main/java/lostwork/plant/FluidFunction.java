package lostwork.plant;

import java.util.List;
import lostwork.plant.kernel.PropertyKind;
import lostwork.quantity.Dimension;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** The property functions that components may use in equations, with the dimensions of their arguments. */
enum FluidFunction {
    ENTHALPY_OF_PRESSURE_AND_ENTROPY(
            "enthalpy",
            PropertyKind.ENTHALPY_PS,
            SpecificEnergy.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), SpecificEntropy.KIND.dimension())),
    ENTHALPY_OF_PRESSURE_AND_TEMPERATURE(
            "enthalpy",
            PropertyKind.ENTHALPY_PT,
            SpecificEnergy.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), Temperature.KIND.dimension())),
    ENTHALPY_OF_PRESSURE_AND_VAPOUR_FRACTION(
            "enthalpy",
            PropertyKind.ENTHALPY_PX,
            SpecificEnergy.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), Ratio.KIND.dimension())),
    TEMPERATURE_OF_PRESSURE_AND_ENTHALPY(
            "temperature",
            PropertyKind.TEMPERATURE_PH,
            Temperature.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), SpecificEnergy.KIND.dimension())),
    ENTROPY_OF_PRESSURE_AND_ENTHALPY(
            "entropy",
            PropertyKind.ENTROPY_PH,
            SpecificEntropy.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), SpecificEnergy.KIND.dimension())),
    VOLUME_OF_PRESSURE_AND_ENTHALPY(
            "specific volume",
            PropertyKind.VOLUME_PH,
            SpecificVolume.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), SpecificEnergy.KIND.dimension())),
    VAPOUR_FRACTION_OF_PRESSURE_AND_ENTHALPY(
            "vapour fraction",
            PropertyKind.VAPOUR_FRACTION_PH,
            Ratio.KIND.dimension(),
            List.of(Pressure.KIND.dimension(), SpecificEnergy.KIND.dimension())),
    SATURATION_TEMPERATURE_OF_PRESSURE(
            "saturation temperature",
            PropertyKind.SATURATION_TEMPERATURE_P,
            Temperature.KIND.dimension(),
            List.of(Pressure.KIND.dimension()));

    private final String words;
    private final PropertyKind kind;
    private final Dimension result;
    private final List<Dimension> arguments;

    FluidFunction(String words, PropertyKind kind, Dimension result, List<Dimension> arguments) {
        this.words = words;
        this.kind = kind;
        this.result = result;
        this.arguments = arguments;
    }

    String words() {
        return words;
    }

    PropertyKind kind() {
        return kind;
    }

    Dimension result() {
        return result;
    }

    Dimension argument(int index) {
        return arguments.get(index);
    }
}
