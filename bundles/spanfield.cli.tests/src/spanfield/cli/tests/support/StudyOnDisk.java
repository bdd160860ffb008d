/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests.support;

import java.nio.file.Path;
import spanfield.model.Circuit;
import spanfield.model.CurrentLoad;
import spanfield.model.FieldLimit;
import spanfield.model.LimitPlace;
import spanfield.model.LoadCase;
import spanfield.model.ProfileStation;
import spanfield.model.SpanfieldFactory;
import spanfield.model.Study;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;
import spanfield.model.io.StudyIds;
import spanfield.model.tests.support.SampleStudies;

/** Study files for tests of the command. Invented data. */
public final class StudyOnDisk {

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;

    private StudyOnDisk() {
    }

    /** A flat line with the load cases Rating (500 A), Peak (300 A) and Typical (150 A), two stations, and a limit at the edges. */
    public static Study study() {
        Study study = SampleStudies.flat();
        Circuit circuit = study.getLines().get(0).getCircuits().get(0);
        addCase(study, circuit, "Peak", 300);
        addCase(study, circuit, "Typical", 150);
        study.getStations().get(0).setSpacingMetres(5);
        ProfileStation second = F.createProfileStation();
        second.setName("Mid-span 2-3");
        second.setStationMetres(-150);
        second.setFromOffsetMetres(-40);
        second.setToOffsetMetres(50);
        second.setSpacingMetres(5);
        study.getStations().add(second);
        FieldLimit limit = F.createFieldLimit();
        limit.setName("Edge limit");
        limit.setLevel(2e-6);
        limit.setPlace(LimitPlace.EDGE);
        study.getLimits().add(limit);
        StudyIds.assignMissing(study);
        return study;
    }

    private static void addCase(Study study, Circuit circuit, String name, double amperes) {
        LoadCase loadCase = F.createLoadCase();
        loadCase.setName(name);
        CurrentLoad load = F.createCurrentLoad();
        load.setCircuit(circuit);
        load.setCurrentAmperes(amperes);
        loadCase.getLoads().add(load);
        study.getLoadCases().add(loadCase);
    }

    /** Saves a study in a folder. */
    public static Path save(Study study, Path folder, String name) {
        Path file = folder.resolve(name);
        try {
            StudyFiles.save(study, file);
        } catch (StudyFileException failure) {
            throw new AssertionError(failure);
        }
        return file;
    }

    /** The study of {@link #study} as a file. */
    public static Path sound(Path folder) {
        return save(study(), folder, "line.spanfield");
    }

    /** A study with two errors: a negative current, and edges in the wrong order. */
    public static Path withErrors(Path folder) {
        Study study = study();
        ((CurrentLoad) study.getLoadCases().get(0).getLoads().get(0)).setCurrentAmperes(-5);
        study.getCorridor().getEdges().get(0).setLeftOffsetMetres(30);
        study.getCorridor().getEdges().get(0).setRightOffsetMetres(-30);
        return save(study, folder, "bad.spanfield");
    }
}
