/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.line.ImpedanceFormula;
import spanfield.study.SoftwareVersion;
import spanfield.study.internal.ParallelGroups.Uncoupled;
import spanfield.study.internal.StudyData.BondingData;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.ConductorData;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.SectionData;
import spanfield.study.internal.StudyData.StringingRule;
import spanfield.study.result.CurrentTable;
import spanfield.study.result.CurrentTable.CurrentSplit;
import spanfield.study.result.Evidence;
import spanfield.study.result.MethodNote;
import spanfield.study.result.Notice;
import spanfield.study.result.StationGeometry;

/** Writes down what a result rests on. */
final class EvidenceWriter {

    /** Turn of a line in degrees from which the mean direction that the half-space correction uses is worth a notice. */
    private static final double NOTABLE_TURN_DEGREES = 5;

    /** Height sum in metres below which the solver evaluates the half-space integral at a substitute height. */
    private static final double LEAST_HEIGHT_SUM_METRES = 0.5;

    /** Residual current worth a notice where the earth is left out, as a part of the greatest phase current. */
    private static final double NOTABLE_RESIDUAL = 1e-3;

    private final PreparedStudy study;
    private final StudyData data;
    private final StudyIdentity identity;

    EvidenceWriter(PreparedStudy study, StudyIdentity identity) {
        this.study = study;
        this.data = study.data();
        this.identity = identity;
    }

    /**
     * @param worstRatio greatest ratio of error bound to resultant
     * @param resolution offset resolution of greatest values in metres; NaN for none
     * @param geometry   wires at the stations of the result
     * @param lowest     elevation of the lowest field point in metres
     */
    Evidence write(double worstRatio, double resolution, List<StationGeometry> geometry, double lowest) {
        List<CurrentTable> currents = currents();
        List<Notice> notices = notices(lowest);
        if (worstRatio > data.relativeAccuracy()) {
            notices.add(Notice.warning(Messages.text("notice.accuracyNotReached", worstRatio, data.relativeAccuracy())));
        }
        return new Evidence(SoftwareVersion.VERSION, data.id(), data.name(), identity.digest(), data.frequencyHertz(), data.earthModel(),
            data.resistivity(), study.earthPlane(), data.impedanceFormula(), data.referenceHeight(), data.relativeAccuracy(), worstRatio,
            resolution, methods(!Double.isNaN(resolution)), currents, geometry, notices,
            List.of(Messages.text("caution.computed"), Messages.text("caution.codes"), Messages.text("caution.live")));
    }

    private List<CurrentTable> currents() {
        return data.cases().stream().map(c -> study.excitation(study.state(c)).table(c)).toList();
    }

    // methods

    private List<MethodNote> methods(boolean maxima) {
        List<MethodNote> notes = new ArrayList<>();
        notes.add(note("method.wires"));
        notes.add(note("method.field"));
        notes.add(earthNote());
        notes.add(note("method.measures"));
        if (inductionUsed()) {
            boolean carson = data.impedanceFormula() == ImpedanceFormula.CARSON;
            notes.add(note(carson ? "method.shields.carson" : "method.shields.complexDepth", resistances()));
        }
        if (uses(StringingRule.Kind.TENSION)) {
            notes.add(note("method.tension"));
        }
        if (maxima) {
            notes.add(note("method.maxima", MaximumSearch.RESOLUTION_METRES));
        }
        notes.add(note("method.errors"));
        return notes;
    }

    private static MethodNote note(String key, Object... arguments) {
        return new MethodNote(Messages.text(key + ".topic"), Messages.text(key, arguments), Messages.text(key + ".source"));
    }

    private MethodNote earthNote() {
        return switch (data.earthModel()) {
            case EXACT_HALF_SPACE -> note("method.earth.exact", data.resistivity());
            case COMPLEX_IMAGES -> note("method.earth.images", data.resistivity());
            case NONE -> note(data.frequencyHertz() == 0 ? "method.earth.directCurrent" : "method.earth.none");
        };
    }

    private String resistances() {
        Set<String> texts = new LinkedHashSet<>();
        for (LineData line : data.lines()) {
            for (ElementData element : line.elements()) {
                if (element.bonding() == BondingData.BONDED) {
                    ConductorData c = element.conductor();
                    texts.add(Messages.text("resistance", c.name(), 1000 * c.resistance(), c.resistanceTemperature()));
                }
            }
        }
        return String.join(", ", texts);
    }

    private boolean bonded(LineData line) {
        return line.elements().stream().anyMatch(e -> e.bonding() == BondingData.BONDED);
    }

    private boolean inductionUsed() {
        return data.frequencyHertz() > 0 && !Double.isNaN(data.resistivity()) && data.lines().stream().anyMatch(this::bonded);
    }

    private boolean uses(StringingRule.Kind kind) {
        return data.lines().stream().flatMap(l -> l.sections().stream()).map(SectionData::ruleOfElement)
            .flatMap(rules -> rules.values().stream()).anyMatch(rule -> rule.kind() == kind);
    }

    // notices

    /**
     * Notices of every result.
     *
     * @param lowest elevation of the lowest field point in metres
     */
    List<Notice> notices(double lowest) {
        List<Notice> notices = new ArrayList<>();
        identity.changes().forEach(change -> notices.add(Notice.information(change)));
        notices.addAll(identity.findings());
        addEarthNotices(notices, lowest);
        addCouplingNotices(notices);
        if (data.electricLimits() > 0) {
            notices.add(Notice.information(data.electricLimits() == 1 ? Messages.text("notice.electricLimits.one")
                : Messages.text("notice.electricLimits", data.electricLimits())));
        }
        return notices;
    }

    private void addEarthNotices(List<Notice> notices, double lowest) {
        if (data.frequencyHertz() == 0) {
            notices.add(Notice.information(Messages.text("notice.directCurrent")));
        } else if (data.earthModel() == EarthModel.NONE) {
            notices.add(Notice.information(Messages.text("notice.noEarth")));
            addResidualNotice(notices);
        } else {
            addPlaneNotices(notices, lowest);
        }
    }

    private void addResidualNotice(List<Notice> notices) {
        for (CurrentTable table : currents()) {
            double greatest = table.circuits().stream().flatMap(c -> c.phases().stream()).mapToDouble(p -> p.amperes().magnitude()).max()
                .orElse(0);
            for (CurrentSplit split : table.splits()) {
                if (split.earth().magnitude() > NOTABLE_RESIDUAL * greatest) {
                    notices.add(Notice.warning(Messages.text("notice.residual", table.loadCase().name(), split.earth().magnitude(),
                        String.join(", ", split.lines()))));
                }
            }
        }
    }

    private void addPlaneNotices(List<Notice> notices, double lowest) {
        double least = Double.POSITIVE_INFINITY;
        double turn = 0;
        for (CaseData loadCase : data.cases()) {
            for (var wire : study.state(loadCase).wires()) {
                least = Math.min(least, wire.path().meanElevationMetres());
                turn = Math.max(turn, Math.toDegrees(wire.path().greatestTurnRadians()));
            }
        }
        if (lowest + least - 2 * study.earthPlane() < LEAST_HEIGHT_SUM_METRES) {
            notices.add(Notice.warning(Messages.text("notice.belowPlane", study.earthPlane())));
        }
        boolean ends = data.lines().stream().anyMatch(l -> l.start() == WireEnd.ENDS || l.finish() == WireEnd.ENDS);
        if (data.earthModel() == EarthModel.EXACT_HALF_SPACE && ends) {
            notices.add(Notice.information(Messages.text("notice.deadEnd")));
        }
        if (data.earthModel() == EarthModel.EXACT_HALF_SPACE && turn > NOTABLE_TURN_DEGREES) {
            notices.add(Notice.information(Messages.text("notice.turns", turn)));
        }
    }

    private void addCouplingNotices(List<Notice> notices) {
        if (!inductionUsed()) {
            return;
        }
        for (Uncoupled pair : study.groups().uncoupled()) {
            boolean matters = data.lines().stream().anyMatch(l -> bonded(l) && (l.name().equals(pair.first()) || l.name().equals(pair.second())));
            if (matters) {
                notices.add(Notice.information(Messages.text("notice.uncoupled", pair.first(), pair.second(), pair.angleDegrees(),
                    ParallelGroups.GREATEST_ANGLE_DEGREES)));
            }
        }
    }
}
