/**
 * The laws of exergy as plain functions of states, heats and an explicit reference environment.
 */
@NullMarked
package lostwork.exergy;

import org.jspecify.annotations.NullMarked;
