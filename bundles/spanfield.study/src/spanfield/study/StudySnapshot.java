/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Severity;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.field.Accuracy;
import spanfield.solver.geometry.Wire;
import spanfield.study.internal.Messages;
import spanfield.study.internal.PreparedStudy;
import spanfield.study.internal.StudyAssembly;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.StationData;
import spanfield.study.internal.StudyIdentity;
import spanfield.study.internal.StudyRunner;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.LeastClearance;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.Notice;
import spanfield.study.result.StationInfo;

/**
 * A sound study at one moment: immutable, thread-safe, free of the model it was taken from. Everything that is computed is computed from a
 * snapshot.
 */
public final class StudySnapshot {

    private final PreparedStudy prepared;
    private final StudyIdentity identity;

    private StudySnapshot(PreparedStudy prepared, StudyIdentity identity) {
        this.prepared = prepared;
        this.identity = identity;
    }

    /**
     * Takes a snapshot, on the calling thread.
     *
     * @throws InvalidStudyException when the study has errors; it carries all findings
     */
    public static StudySnapshot of(Study study) {
        StudyAssembly assembly = new StudyAssembly(study);
        if (assembly.prepared() == null) {
            throw new InvalidStudyException(assembly.findings());
        }
        List<Notice> notices = assembly.findings().stream().map(StudySnapshot::notice).toList();
        return new StudySnapshot(assembly.prepared(), new StudyIdentity(digest(StudyFiles.serialize(study)), notices, List.of()));
    }

    private static Notice notice(Finding finding) {
        return new Notice(finding.severity() == Severity.WARNING ? Notice.Severity.WARNING : Notice.Severity.INFORMATION, finding.message());
    }

    private static String digest(byte[] saved) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(saved));
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java platform has SHA-256", impossible);
        }
    }

    /** Identifier of the study. */
    public String studyId() {
        return prepared.data().id();
    }

    /** Name of the study. */
    public String studyName() {
        return prepared.data().name();
    }

    /** SHA-256 of the study in its saved form, lower-case hexadecimal. Changes made by the {@code with} methods do not enter it. */
    public String digest() {
        return identity.digest();
    }

    /** Frequency in hertz; 0 for direct current. */
    public double frequencyHertz() {
        return prepared.data().frequencyHertz();
    }

    /** Earth resistivity in ohm metres, where the study states one. */
    public OptionalDouble earthResistivityOhmMetres() {
        double value = prepared.data().resistivity();
        return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /** Earth model of reported values: none for direct current or without a resistivity, whatever the study says. */
    public EarthModel earthModel() {
        return prepared.data().earthModel();
    }

    /** Elevation of the one earth plane in metres: mean ground level under the modelled spans, weighted by length. */
    public double earthPlaneMetres() {
        return prepared.earthPlane();
    }

    /** Height of profile points above the local ground in metres. */
    public double referenceHeightMetres() {
        return prepared.data().referenceHeight();
    }

    /** Relative numerical accuracy asked of the resultant. */
    public double relativeAccuracy() {
        return prepared.data().relativeAccuracy();
    }

    /** The corridor in plan. */
    public CorridorPlan plan() {
        return prepared.data().plan();
    }

    /** Load cases in the order of the study. */
    public List<CaseInfo> cases() {
        return StudyRunner.caseInfos(prepared);
    }

    /** Stations in the order of the study. */
    public List<StationInfo> stations() {
        return prepared.data().stations().stream().map(StationData::info).toList();
    }

    /** Limits for the magnetic field in the order of the study. */
    public List<LimitInfo> limits() {
        return prepared.data().limits();
    }

    /** Warnings and information that go with every result of this snapshot. */
    public List<Notice> notices() {
        return StudyRunner.notices(prepared, identity);
    }

    /**
     * Single wires of a load case as the solver sees them, swung by its wind: subconductors one by one.
     *
     * @param caseId identifier of the load case
     */
    public List<Wire> wires(String caseId) {
        return prepared.wires(find(prepared.data().cases(), c -> c.info().id(), caseId, Messages.text("request.loadCase")));
    }

    /**
     * Single wires of a line in a load case, swung by its wind: subconductors one by one.
     *
     * @param caseId identifier of the load case
     * @param line   index of the line in the study, from 0
     */
    public List<Wire> wires(String caseId, int line) {
        requireLine(line);
        return prepared.wires(find(prepared.data().cases(), c -> c.info().id(), caseId, Messages.text("request.loadCase")), line);
    }

    /**
     * Where the wires of a line come nearest to the ground, over all load cases; empty for a line without wires.
     *
     * @param line index of the line in the study, from 0
     */
    public Optional<LeastClearance> leastClearance(int line) {
        requireLine(line);
        return Optional.ofNullable(prepared.leastClearance(line));
    }

    /** Number of lines. */
    public int lineCount() {
        return prepared.data().lines().size();
    }

    private void requireLine(int line) {
        if (line < 0 || line >= lineCount()) {
            throw new IndexOutOfBoundsException("line " + line + " of a study with " + lineCount() + " lines");
        }
    }

    /** The same study at another accuracy, dimensionless, {@link Accuracy#FINEST} to {@link Accuracy#COARSEST}. */
    public StudySnapshot withAccuracy(double relative) {
        if (!(relative >= Accuracy.FINEST && relative <= Accuracy.COARSEST)) {
            throw new StudyInputException(Messages.text("request.accuracy", relative, Accuracy.FINEST, Accuracy.COARSEST));
        }
        return changed(relative, earthModel(), prepared.data().cases(), prepared.data().stations(),
            relative == relativeAccuracy() ? null : Messages.text("change.accuracy", relative, relativeAccuracy()));
    }

    /**
     * The same study under another earth model.
     *
     * @throws StudyInputException where the model needs what the study does not have
     */
    public StudySnapshot withEarthModel(EarthModel model) {
        return new StudySnapshot(StudyRunner.withEarthModel(prepared, model),
            identity(model == earthModel() ? null : Messages.text("change.earthModel")));
    }

    /**
     * Only some load cases, in the order of the study.
     *
     * @param ids identifiers, at least one
     */
    public StudySnapshot withCases(Collection<String> ids) {
        ids.forEach(id -> find(prepared.data().cases(), c -> c.info().id(), id, Messages.text("request.loadCase")));
        List<CaseData> chosen = prepared.data().cases().stream().filter(c -> ids.contains(c.info().id())).toList();
        requireSome(chosen, Messages.text("request.loadCase"));
        return changed(relativeAccuracy(), earthModel(), chosen, prepared.data().stations(), null);
    }

    /**
     * Only some stations, in the order of the study.
     *
     * @param ids identifiers, at least one
     */
    public StudySnapshot withStations(Collection<String> ids) {
        ids.forEach(id -> find(prepared.data().stations(), s -> s.info().id(), id, Messages.text("request.station")));
        List<StationData> chosen = prepared.data().stations().stream().filter(s -> ids.contains(s.info().id())).toList();
        requireSome(chosen, Messages.text("request.station"));
        return changed(relativeAccuracy(), earthModel(), prepared.data().cases(), chosen, null);
    }

    private static void requireSome(List<?> chosen, String what) {
        if (chosen.isEmpty()) {
            throw new StudyInputException(Messages.text("request.none", what));
        }
    }

    private static <T> T find(List<T> all, Function<T, String> id, String wanted, String what) {
        return all.stream().filter(t -> id.apply(t).equals(wanted)).findFirst().orElseThrow(() -> new StudyInputException(
            Messages.text("request.unknown", what, wanted, all.stream().map(id).collect(Collectors.joining(", ")))));
    }

    private StudySnapshot changed(double accuracy, EarthModel model, List<CaseData> cases, List<StationData> stations, String change) {
        return new StudySnapshot(prepared.with(accuracy, model, cases, stations), identity(change));
    }

    private StudyIdentity identity(String change) {
        List<String> changes = new ArrayList<>(identity.changes());
        if (change != null) {
            changes.add(change);
        }
        return new StudyIdentity(identity.digest(), identity.findings(), changes);
    }

    PreparedStudy prepared() {
        return prepared;
    }

    StudyIdentity identity() {
        return identity;
    }
}
