/** Assessment to drawings, HTML and PDF. It prints; it calculates nothing. */
package org.mastwright.report;
