/** Gases: perfect, ideal with temperature-dependent heat capacities, and ideal mixtures of them. */
@NullMarked
package lostwork.fluid.gas;

import org.jspecify.annotations.NullMarked;
