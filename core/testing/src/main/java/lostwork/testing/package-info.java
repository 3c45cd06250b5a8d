/**
 * What the tests of every module share: printed values of published tables, and the size of random campaigns.
 *
 * <p>Only tests depend on this package; it knows nothing of the library.
 */
@NullMarked
package lostwork.testing;

import org.jspecify.annotations.NullMarked;
