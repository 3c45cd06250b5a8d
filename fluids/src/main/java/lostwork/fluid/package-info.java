/**
 * Fluids and their states: the typed face ({@link lostwork.fluid.Fluid}, {@link lostwork.fluid.FluidState}) and the
 * small primitive interface behind it ({@link lostwork.fluid.FluidModel}).
 */
@NullMarked
package lostwork.fluid;

import org.jspecify.annotations.NullMarked;
