package org.rodside.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.rodside.io.CaseText;
import org.rodside.model.InputException;
import org.rodside.report.LoadsReport;
import org.rodside.study.Front;
import org.rodside.study.LoadCase;
import org.rodside.study.LoadsAnswer;
import org.rodside.study.WorstLoads;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code loads}. */
@Command(
        name = "loads",
        mixinStandardHelpOptions = true,
        description = "Worst loads of every cylinder and pin over the whole stroke box and all load cases.",
        footer = {"", "Example:", "  rodside loads linkages/sallow-22.json --density 2000 --case drop=0,40,0"})
final class LoadsCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Mixin
    private CaseOptions caseOptions;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        LoadsAnswer answer;
        try (Progress progress = common.progress("worst loads")) {
            answer = WorstLoads.find(front, caseOptions.cases(front), common.threads(), progress);
        }
        LoadsReport report = new LoadsReport(front, answer, common.units());
        common.folder(file.path()).ifPresent(report::files);
        common.tell(front, report::json, report::text);
        return ExitStatus.DONE;
    }

    /** Load cases as typed. Use as {@code @Mixin CaseOptions cases}. */
    static final class CaseOptions {

        @Option(
                names = "--density",
                paramLabel = "KG/M3",
                description = "Density of what fills the bucket; in kg/m3. Default: 1800")
        private String density;

        @Option(
                names = "--case",
                paramLabel = "NAME=FX,FY,PAYLOAD",
                description = "A case of your own: force of the ground on the tip in kN, payload in kg. Repeatable.")
        private List<String> own = new ArrayList<>();

        List<LoadCase> cases(Front front) {
            List<String> faults = new ArrayList<>();
            List<LoadCase> cases = new ArrayList<>(WorstLoads.usualCases(front, fill(faults)));
            Map<String, double[]> read = Map.of();
            try {
                read = CaseText.read("--case", own, List.of("carry", "curl", "crowd"));
            } catch (InputException e) {
                faults.addAll(e.faults());
            }
            if (!faults.isEmpty()) {
                throw new InputException(faults);
            }
            read.forEach((name, load) -> cases.add(WorstLoads.given(front, name, load)));
            return cases;
        }

        private double fill(List<String> faults) {
            try {
                return CaseText.density("--density", Optional.ofNullable(density), WorstLoads.USUAL_DENSITY);
            } catch (InputException e) {
                faults.addAll(e.faults());
                return WorstLoads.USUAL_DENSITY;
            }
        }
    }
}
