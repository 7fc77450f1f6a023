/** The one pipeline that runs everything in order, and the records it hands to paper and screen. */
package org.mastwright.assess;
