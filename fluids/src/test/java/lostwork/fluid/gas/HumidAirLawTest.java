package lostwork.fluid.gas;

import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;

class HumidAirLawTest extends FluidContract {
    @Override
    protected Fluid fluid() {
        return HumidAir.of(celsius(12), mbar(1013), percent(70));
    }
}
