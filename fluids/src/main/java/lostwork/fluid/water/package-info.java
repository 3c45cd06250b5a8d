/**
 * Water and steam.
 */
@NullMarked
package lostwork.fluid.water;

import org.jspecify.annotations.NullMarked;
