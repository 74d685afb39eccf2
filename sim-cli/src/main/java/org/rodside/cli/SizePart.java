package org.rodside.cli;

import java.util.List;
import java.util.OptionalDouble;
import org.rodside.report.SizeReport;
import org.rodside.study.LoadsAnswer;
import org.rodside.study.SizeQuestion;
import org.rodside.study.SizeRow;
import org.rodside.study.Sizing;

/** Cylinder sizes as part of {@code study}. */
final class SizePart implements StudyPart {

    @Override
    public String name() {
        return "size";
    }

    @Override
    public Told tell(Desk desk) {
        int threads = desk.common().threads();
        SizeQuestion question = new SizeQuestion(
                OptionalDouble.empty(), SizeQuestion.USUAL_FACTOR, SizeQuestion.USUAL_SPEED, OptionalDouble.empty());
        LoadsAnswer loads = desk.loads().get();
        List<SizeRow> rows = Sizing.find(desk.front(), loads, question, threads, done -> {});
        SizeReport report =
                new SizeReport(desk.front(), question, rows, desk.common().units());
        desk.folder().ifPresent(folder -> {
            report.files(folder);
            report.section(desk.page());
        });
        return new Told(report.json(), report.text());
    }
}
