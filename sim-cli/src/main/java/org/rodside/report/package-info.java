/** Reports: a page to print, plain tables for the terminal, pictures of a linkage, the cautions that go with all of them. */
package org.rodside.report;
