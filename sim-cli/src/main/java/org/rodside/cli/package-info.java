/** The command line: options in, studies run, tables and pictures out. No arithmetic; the only package with picocli. */
package org.rodside.cli;
