/** Pictures: one description of a plot, painted as PNG or written as SVG. The only package that knows XChart. */
package org.rodside.chart;
