/** One class for each question a user asks of a front; sweeping, refining and merging live here. */
package org.rodside.study;
