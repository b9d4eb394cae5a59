package org.wardon;

import java.lang.annotation.Documented;
import java.lang.annotation.ElementType;
import java.lang.annotation.Target;

/** Where the expected values of a test were published. */
@Documented
@Target({ElementType.METHOD, ElementType.TYPE, ElementType.FIELD})
public @interface Source {
    /** Author or publisher, year, chapter, table or equation. */
    String value();
}
