/** The tower file: read, told where it is wrong, bound to a design; results.json and tables. */
package org.mastwright.file;
