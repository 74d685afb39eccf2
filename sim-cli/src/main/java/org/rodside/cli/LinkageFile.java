package org.rodside.cli;

import java.nio.file.Path;
import org.rodside.io.LinkageReader;
import org.rodside.model.Linkage;
import picocli.CommandLine.Parameters;

/** The linkage file as first argument. Use as {@code @Mixin LinkageFile linkage}. */
final class LinkageFile {

    @Parameters(index = "0", paramLabel = "LINKAGE.json", description = "The linkage file.")
    private Path path;

    Path path() {
        return path;
    }

    /** Reads the file with the overrides of {@code --set}; throws InputException with every fault. */
    Linkage read(CommonOptions common) {
        return LinkageReader.read(path, common.overrides());
    }
}
