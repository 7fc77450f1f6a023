/** Air density, design wind speeds and their conversions. */
package org.mastwright.wind;
