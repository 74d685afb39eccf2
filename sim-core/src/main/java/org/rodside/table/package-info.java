/** One columnar type in and out: CSV, charts and reports read and write it. */
package org.rodside.table;
