/** JSON to model, CSV to table: the only package that opens files and the only one that knows Jackson. */
package org.rodside.io;
