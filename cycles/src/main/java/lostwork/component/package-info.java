/** The machines and apparatus that plants are built from; each states its variables and equations and nothing else. */
@NullMarked
package lostwork.component;

import org.jspecify.annotations.NullMarked;
