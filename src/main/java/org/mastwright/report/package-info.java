/**
 * An assessment becomes paper: drawings, charts, XHTML, PDF. Nothing is calculated here; only
 * {@code Scale} does arithmetic, and it scales drawings.
 */
package org.mastwright.report;
