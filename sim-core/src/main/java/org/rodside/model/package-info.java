/** The linkage as drawn: immutable records in SI units, no computation. */
package org.rodside.model;
