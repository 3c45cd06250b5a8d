/** Plants as equations in named, typed variables: built, specified, diagnosed and solved. */
@NullMarked
package lostwork.plant;

import org.jspecify.annotations.NullMarked;
