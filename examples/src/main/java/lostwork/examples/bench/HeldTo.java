package lostwork.examples.bench;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** What a benchmark method is measured against, and how its time may compare. */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.METHOD)
public @interface HeldTo {
    /** {@return the name of the baseline, a method of the same class} */
    String baseline();

    /** {@return the highest allowed time over that of the baseline; infinite where the ratio is only reported} */
    double atMost() default Double.POSITIVE_INFINITY;

    /** {@return whether the method must not allocate} */
    boolean withoutAllocation() default false;

    /** {@return whether the method returns another number than its baseline, such as a part of its work} */
    boolean otherResult() default false;
}
