/** Short programs that show one use each; README.md prints them, and a test holds both equal. */
@NullMarked
package lostwork.examples.guide;

import org.jspecify.annotations.NullMarked;
