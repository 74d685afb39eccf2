package org.rodside.cli;

import java.util.function.Supplier;
import org.rodside.study.Front;
import org.rodside.study.LoadsAnswer;
import org.rodside.study.WorstLoads;

/** Worst loads of the usual cases, searched when first asked for and kept. */
final class LoadsOnce implements Supplier<LoadsAnswer> {

    private final Front front;
    private final int threads;
    private LoadsAnswer found;

    LoadsOnce(Front front, int threads) {
        this.front = front;
        this.threads = threads;
    }

    @Override
    public LoadsAnswer get() {
        if (found == null) {
            found = WorstLoads.find(front, WorstLoads.usualCases(front, WorstLoads.USUAL_DENSITY), threads, done -> {});
        }
        return found;
    }
}
