package lostwork.fluid.gas;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.Ratio.percent;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;

class FlueGasLawTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));
    }
}
