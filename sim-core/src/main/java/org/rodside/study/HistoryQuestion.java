package org.rodside.study;

/**
 * How a history is made.
 *
 * @param measured whether the rows carry pressures in place of the tip force
 * @param atRest whether inertia is left out
 * @param pump flow the pump can give; in m³/s, infinite where it is not judged
 */
public record HistoryQuestion(boolean measured, boolean atRest, double pump) {}
