package lostwork.plant;

import lostwork.fluid.FluidModel;
import lostwork.plant.kernel.Tape;

/** What the names of an expression mean in a built plant. */
interface Resolution {
    /** {@return the model of the fluid at a port} */
    FluidModel modelAt(MaterialPort port);

    /** Writes a variable to a tape and gives its node. */
    int emit(Variable<?> variable, Tape.Builder tape);
}
