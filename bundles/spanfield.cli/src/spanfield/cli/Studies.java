/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import spanfield.model.Study;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;
import spanfield.solver.earth.EarthModel;
import spanfield.study.StudyInputException;
import spanfield.study.StudySnapshot;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.StationInfo;

/** Gets from a file name to what is to be computed. */
final class Studies {

    private Studies() {
    }

    /** Reads a study file. */
    static Study load(Path file) {
        try {
            return StudyFiles.load(file);
        } catch (StudyFileException failure) {
            throw CommandException.file(failure.getMessage());
        }
    }

    /**
     * A sound study with the load cases, earth model and accuracy that the options ask for.
     *
     * @throws spanfield.study.InvalidStudyException when the study has errors
     * @throws CommandException when an option asks for what the study does not have
     */
    static StudySnapshot snapshot(Path file, Settings settings) {
        StudySnapshot snapshot = StudySnapshot.of(load(file));
        try {
            if (!settings.cases().isEmpty()) {
                snapshot = snapshot.withCases(ids(settings.cases(), snapshot.cases(), CaseInfo::id, CaseInfo::name, "load case"));
            }
            if (settings.earth().isPresent()) {
                requireEarth(snapshot, settings.earth().get());
                snapshot = snapshot.withEarthModel(settings.earth().get());
            }
            return settings.accuracy().isPresent() ? snapshot.withAccuracy(settings.accuracy().get()) : snapshot;
        } catch (StudyInputException refused) {
            throw CommandException.argument(refused.getMessage());
        }
    }

    /** An earth model needs a resistivity and an alternating field. */
    private static void requireEarth(StudySnapshot snapshot, EarthModel model) {
        if (model == EarthModel.NONE) {
            return;
        }
        if (snapshot.frequencyHertz() == 0) {
            throw CommandException.argument("the study is of direct current, which has no earth effect; leave --earth away, or choose none");
        }
        if (snapshot.earthResistivityOhmMetres().isEmpty()) {
            throw CommandException.argument("the study has no earth resistivity, which this --earth needs; give one in the study, or choose none");
        }
    }

    /** The stations of the study that the option names; all of them without the option. */
    static StudySnapshot stations(StudySnapshot snapshot, List<String> wanted) {
        return wanted.isEmpty() ? snapshot
            : snapshot.withStations(ids(wanted, snapshot.stations(), StationInfo::id, StationInfo::name, "station"));
    }

    /** Identifiers of the elements that are wanted, by identifier or name. */
    static <T> Set<String> ids(List<String> wanted, List<T> all, Function<T, String> id, Function<T, String> name, String what) {
        Set<String> ids = new LinkedHashSet<>();
        for (String word : wanted) {
            List<String> found = matching(word, all, id, name);
            if (found.isEmpty()) {
                throw CommandException.argument(unknown(what, word, names(all, id, name), "the study has: " + join(all, id, name)));
            }
            if (found.size() > 1) {
                throw CommandException.argument(what + " '" + word + "' is not the only one of that name; use an identifier: "
                    + String.join(", ", found));
            }
            ids.add(found.get(0));
        }
        return ids;
    }

    /** Identifiers first, then names, then names without regard to case. */
    private static <T> List<String> matching(String word, List<T> all, Function<T, String> id, Function<T, String> name) {
        List<String> byId = all.stream().map(id).filter(word::equals).toList();
        if (!byId.isEmpty()) {
            return byId;
        }
        List<String> byName = all.stream().filter(t -> name.apply(t).equals(word)).map(id).toList();
        return !byName.isEmpty() ? byName
            : all.stream().filter(t -> name.apply(t).equalsIgnoreCase(word) || id.apply(t).equalsIgnoreCase(word)).map(id).toList();
    }

    static String unknown(String what, String word, Collection<String> known, String rest) {
        return "unknown " + what + " '" + word + "'; " + rest + Suggestions.hint(word, known);
    }

    private static <T> Set<String> names(List<T> all, Function<T, String> id, Function<T, String> name) {
        Set<String> names = new LinkedHashSet<>();
        all.forEach(t -> names.add(id.apply(t)));
        all.forEach(t -> names.add(name.apply(t)));
        return names;
    }

    /** Identifiers, each with its name where that differs. */
    static <T> String join(List<T> all, Function<T, String> id, Function<T, String> name) {
        List<String> texts = new ArrayList<>();
        for (T t : all) {
            boolean same = name.apply(t).isBlank() || name.apply(t).equalsIgnoreCase(id.apply(t));
            texts.add(same ? id.apply(t) : id.apply(t) + " (" + name.apply(t) + ")");
        }
        return String.join(", ", texts);
    }

    /**
     * The station of a profile: one of the study by identifier or name, or a position along the corridor, which borrows the extent of the
     * nearest station of the study.
     */
    static StationInfo station(StudySnapshot snapshot, String wanted, Settings settings) {
        List<String> found = matching(wanted, snapshot.stations(), StationInfo::id, StationInfo::name);
        if (found.size() == 1) {
            return snapshot.stations().stream().filter(station -> station.id().equals(found.get(0))).findFirst().orElseThrow();
        }
        if (found.size() > 1) {
            throw CommandException.argument("station '" + wanted + "' is not the only one of that name; use an identifier: "
                + String.join(", ", found));
        }
        double metres = Settings.number(wanted).map(settings.units().length()::toMetres).orElseThrow(() -> CommandException.argument(
            unknown("station", wanted, names(snapshot.stations(), StationInfo::id, StationInfo::name), "the study has: "
                + join(snapshot.stations(), StationInfo::id, StationInfo::name) + "; a number is a position along the corridor in "
                + settings.units().length().code())));
        StationInfo nearest = snapshot.stations().stream()
            .min((a, b) -> Double.compare(Math.abs(a.stationMetres() - metres), Math.abs(b.stationMetres() - metres))).orElseThrow();
        try {
            return StationInfo.at(metres, nearest.fromOffsetMetres(), nearest.toOffsetMetres(), nearest.spacingMetres());
        } catch (StudyInputException refused) {
            throw CommandException.argument(refused.getMessage());
        }
    }
}
