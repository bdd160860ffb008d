/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import spanfield.model.validation.Finding;
import spanfield.report.CheckReport;
import spanfield.report.CsvWriter;
import spanfield.report.EdgeReport;
import spanfield.report.PointReport;
import spanfield.report.ProfileReport;
import spanfield.report.ReportOptions;
import spanfield.solver.Progress;
import spanfield.study.StudyCheck;
import spanfield.study.StudyInputException;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.Notice;
import spanfield.study.result.PointTable;
import spanfield.study.result.StationInfo;

/** Does what the verbs say. */
final class Commands {

    private final Terminal terminal;
    private final Cancellation cancellation;

    Commands(Terminal terminal, Cancellation cancellation) {
        this.terminal = terminal;
        this.cancellation = cancellation;
    }

    /** Runs a verb. */
    ExitCode run(Verb verb, Args args) {
        return switch (verb) {
            case CHECK -> check(args);
            case EDGES -> edges(args);
            case PROFILE -> profile(args);
            case POINTS -> points(args);
        };
    }

    private ExitCode check(Args args) {
        if (args.operands().isEmpty()) {
            throw CommandException.argument("check needs at least one study file, for example: " + Verb.CHECK.examples().get(0));
        }
        List<Path> studies = args.operands().stream().map(study -> Args.path(study, "the study file")).toList();
        boolean csv = Settings.csv(args);
        Results results = new Results(terminal, cancellation, csv, args.path(Args.OUTPUT), studies);
        Map<Path, List<Finding>> findings = new LinkedHashMap<>();
        for (Path study : studies) {
            try {
                findings.put(study, StudyCheck.check(Studies.load(study)));
            } catch (CommandException unreadable) {
                // The other studies are still worth checking.
                Main.complain(terminal, unreadable.lines());
            }
        }
        results.write(csv ? out -> checkCsv(findings, out) : text(checkText(findings)), List.of());
        boolean sound = findings.values().stream().flatMap(List::stream).noneMatch(Finding::isError);
        return findings.keySet().containsAll(studies) ? sound ? ExitCode.DONE : ExitCode.STUDY_HAS_ERRORS : ExitCode.FILE;
    }

    private static void checkCsv(Map<Path, List<Finding>> findings, Appendable out) {
        CsvWriter writer = CheckReport.csv(out);
        findings.forEach((study, found) -> CheckReport.csv(study.toString(), found, writer));
    }

    private static String checkText(Map<Path, List<Finding>> findings) {
        List<String> texts = new ArrayList<>();
        findings.forEach((study, found) -> texts.add(CheckReport.text(study.toString(), found)));
        return String.join("\n", texts);
    }

    private ExitCode edges(Args args) {
        Path file = Args.path(args.study(), "the study file");
        Settings settings = Settings.of(args);
        Results results = new Results(terminal, cancellation, settings.csv(), args.path(Args.OUTPUT), List.of(file));
        StudySnapshot snapshot = Studies.stations(Studies.snapshot(file, settings), args.all(Args.STATION));
        EdgeTable table = computed(progress -> new StudyRun().edgeTable(snapshot, progress));
        results.write(settings.csv() ? out -> EdgeReport.csv(table, settings.units(), out)
            : text(EdgeReport.text(table, options(settings, results, file))), List.of());
        warn(settings, table.evidence());
        return ExitCode.DONE;
    }

    private ExitCode profile(Args args) {
        Path file = Args.path(args.study(), "the study file");
        Settings settings = Settings.of(args);
        Results results = new Results(terminal, cancellation, settings.csv(), args.path(Args.OUTPUT), List.of(file));
        ProfilePictures pictures = ProfilePictures.of(args, results);
        StudySnapshot snapshot = Studies.snapshot(file, settings);
        StationInfo station = profileStation(snapshot, args.value(Args.STATION), settings);
        LateralProfile profile = computed(progress -> new StudyRun().profile(snapshot, station, progress));
        results.write(settings.csv() ? out -> ProfileReport.csv(profile, settings.units(), out)
            : text(ProfileReport.text(profile, options(settings, results, file))), pictures.draw(profile, settings));
        warn(settings, profile.evidence());
        return ExitCode.DONE;
    }

    /** The outcome of a computation, with its progress shown; what it cannot do is a matter of the arguments. */
    private <T> T computed(Function<Progress, T> computation) {
        try (TerminalProgress progress = new TerminalProgress(terminal, cancellation)) {
            return computation.apply(progress);
        } catch (StudyInputException refused) {
            throw CommandException.argument(refused.getMessage());
        }
    }

    private static Consumer<Appendable> text(String text) {
        return out -> {
            try {
                out.append(text);
            } catch (IOException failure) {
                throw new UncheckedIOException(failure);
            }
        };
    }

    private StationInfo profileStation(StudySnapshot snapshot, Optional<String> wanted, Settings settings) {
        if (wanted.isPresent()) {
            return Studies.station(snapshot, wanted.get(), settings);
        }
        List<StationInfo> stations = snapshot.stations();
        if (stations.size() > 1) {
            note("the profile is that of the first station; --station chooses another: "
                + Studies.join(stations, StationInfo::id, StationInfo::name));
        }
        return stations.get(0);
    }

    private ExitCode points(Args args) {
        Path file = Args.path(args.study(), "the study file");
        Settings settings = Settings.of(args);
        String source = args.value(Args.AT).orElseThrow(() -> CommandException.argument(
            "points needs --at FILE with the points, or --at - for standard input; see: spanfield help points"));
        boolean standardInput = source.equals("-");
        List<Path> inputs = standardInput ? List.of(file) : List.of(file, Args.path(source, "--at"));
        Results results = new Results(terminal, cancellation, settings.csv(), args.path(Args.OUTPUT), inputs);
        String name = standardInput ? "standard input" : source;
        PointsFile points = PointsFile.read(standardInput ? standardInput() : content(inputs.get(1)), name);
        if (!points.ignored().isEmpty()) {
            note("columns of " + name + " that are not used: " + String.join(", ", points.ignored()));
        }
        StudySnapshot snapshot = Studies.snapshot(file, settings);
        PointTable table = compute(snapshot, points, name);
        results.write(settings.csv() ? out -> PointReport.csv(table, points.names(), settings.units(), out)
            : text(PointReport.text(table, points.names(), options(settings, results, file))), List.of());
        warn(settings, table.evidence());
        return ExitCode.DONE;
    }

    private PointTable compute(StudySnapshot snapshot, PointsFile points, String source) {
        StudyRun run = new StudyRun();
        List<String> problems = run.problems(snapshot, points.points()).stream()
            .map(p -> source + ", line " + points.lines().get(p.index()) + ": " + p.message()).toList();
        if (!problems.isEmpty()) {
            throw new CommandException(ExitCode.FILE, PointsFile.shortened(problems));
        }
        return computed(progress -> run.points(snapshot, points.points(), progress));
    }

    private byte[] standardInput() {
        try {
            return terminal.in().readAllBytes();
        } catch (IOException failure) {
            throw CommandException.file("standard input cannot be read: " + failure.getMessage());
        }
    }

    private static byte[] content(Path file) {
        try {
            if (Files.isDirectory(file)) {
                throw CommandException.file("'" + file + "' is a folder; name a CSV file with points");
            }
            return Files.readAllBytes(file);
        } catch (NoSuchFileException missing) {
            throw CommandException.file("there is no file '" + file + "'; check the path");
        } catch (AccessDeniedException denied) {
            throw CommandException.file("the file '" + file + "' may not be read; check its permissions");
        } catch (IOException failure) {
            throw CommandException.file("the file '" + file + "' cannot be read: " + failure.getMessage());
        }
    }

    private static ReportOptions options(Settings settings, Results results, Path file) {
        return new ReportOptions(settings.units(), settings.measure(), results.style(), file.toString());
    }

    /** CSV has no place for warnings: they go to standard error, so that they are not lost. */
    private void warn(Settings settings, Evidence evidence) {
        evidence.notices().stream().filter(notice -> settings.csv() && notice.severity() == Notice.Severity.WARNING)
            .forEach(notice -> note("warning: " + notice.text()));
    }

    private void note(String text) {
        terminal.err().println("spanfield: " + text);
    }
}
