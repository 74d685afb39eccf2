package org.rodside.cli;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import org.rodside.model.DutyPass;
import org.rodside.report.PageWriter;
import org.rodside.study.Front;
import org.rodside.study.LoadsAnswer;

/** One question among those that {@code study} asks: computes, writes its files, adds its section to the page. */
interface StudyPart {

    /**
     * What a part works on. {@code folder} is empty where no files are wanted; {@code loads} are the worst loads of the usual
     * cases, searched once when first asked for; {@code pass} is what {@code passFile} holds, empty where there is no such file.
     */
    record Desk(
            Front front,
            CommonOptions common,
            Optional<Path> folder,
            PageWriter page,
            Supplier<LoadsAnswer> loads,
            Optional<DutyPass> pass,
            Path passFile) {}

    /** What a part found: a JSON tree, and text for the one-page summary. */
    record Told(Map<String, Object> json, String text) {}

    /** Name of the part, that of the command which asks it alone. */
    String name();

    /**
     * Answers.
     *
     * @throws org.rodside.model.InputException where the linkage file lacks what the question needs
     */
    Told tell(Desk desk);
}
