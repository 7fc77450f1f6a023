/** Commands, exit codes, progress. */
package org.mastwright.cli;
