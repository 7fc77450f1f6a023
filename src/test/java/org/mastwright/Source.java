package org.mastwright;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Where an expected value comes from, outside the project. */
@Retention(RetentionPolicy.RUNTIME)
@Target({ElementType.METHOD, ElementType.TYPE})
public @interface Source {
  /** Document with edition, handbook, report number, or the name of a closed form. */
  String key();

  /** Clause, table, equation or page. */
  String locator();

  /** How the value is known: read, recalled, recomputed or practice. */
  String status() default "recalled";
}
