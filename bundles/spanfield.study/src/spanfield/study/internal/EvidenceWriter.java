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

    private static final List<String> CAUTIONS = List.of(
        "These are computed values for planning and screening; measurements and local conditions may differ by some per cent and more.",
        "Local codes and licensed practice decide which limits, loads and clearances hold; this result does not replace them.",
        "Live lines can kill: keep the safe approach distances, and leave work on or near lines to qualified people.");

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
            notices.add(Notice.warning("The numerical error bound reaches " + Texts.number(worstRatio) + " of the resultant, where "
                + Texts.number(data.relativeAccuracy()) + " was asked: double precision allows no better where the phases cancel so far."));
        }
        return new Evidence(SoftwareVersion.VERSION, data.id(), data.name(), identity.digest(), data.frequencyHertz(), data.earthModel(),
            data.resistivity(), study.earthPlane(), data.impedanceFormula(), data.referenceHeight(), data.relativeAccuracy(), worstRatio,
            resolution, methods(!Double.isNaN(resolution)), currents, geometry, notices, CAUTIONS);
    }

    private List<CurrentTable> currents() {
        return data.cases().stream().map(c -> study.excitation(study.state(c)).table(c)).toList();
    }

    // methods

    private List<MethodNote> methods(boolean maxima) {
        List<MethodNote> notes = new ArrayList<>();
        notes.add(new MethodNote("Wires", "Every span hangs as an exact catenary between its attachments; wind turns it about its chord by the "
            + "swing angle, insulator strings stay vertical. Beyond the first and last structure wires go on straight and level. "
            + "Subconductors are separate wires that share the current evenly.", "catenary: any text on the mechanics of overhead lines"));
        notes.add(new MethodNote("Field", "Biot-Savart law along the true path of every wire by graded Gauss-Legendre quadrature, endless tails in "
            + "closed form; the field of each wire per ampere first, then load cases as sums of phasors.", "Biot-Savart law"));
        notes.add(earthNote());
        notes.add(new MethodNote("Measures", "Resultant: root of the sum of the squared RMS components. Major axis: major semi-axis of the "
            + "field ellipse.", "IEEE Std 644; IEC 61786-1"));
        if (inductionUsed()) {
            notes.add(shieldNote());
        }
        if (uses(StringingRule.Kind.TENSION)) {
            notes.add(new MethodNote("Tension", "Catenary constant = horizontal tension over mass per length times 9.80665 m/s2.",
                "standard acceleration of free fall, CGPM 1901"));
        }
        if (maxima) {
            notes.add(new MethodNote("Greatest values", "Found between the points of the profile by successive division, to an offset of "
                + Texts.number(MaximumSearch.RESOLUTION_METRES) + " m.", "numerical search"));
        }
        notes.add(new MethodNote("Errors", "The numerical error is a bound from the quadrature and rounding. The model error is the difference of the "
            + "value between the two earth models; it leaves out what both neglect: layered earth, footing resistances, steel structures.",
            "own estimate"));
        return notes;
    }

    private MethodNote earthNote() {
        return switch (data.earthModel()) {
            case EXACT_HALF_SPACE -> new MethodNote("Earth", "Homogeneous half-space of " + Texts.number(data.resistivity())
                + " ohm m: complex image of the true path, corrected by the exact integral less the complex image of each wire's mean straight line.",
                "Carson, Bell System Technical Journal 5, 1926; Wait, 1961; Deri, Tevan, Semlyen, Castanheira, IEEE Trans. PAS-100, 1981");
            case COMPLEX_IMAGES -> new MethodNote("Earth", "Image of every wire in the complex depth of an earth of "
                + Texts.number(data.resistivity()) + " ohm m, an approximation whose deviation from the exact half-space is the model error.",
                "Deri, Tevan, Semlyen, Castanheira, IEEE Trans. PAS-100 no. 8, 1981");
            case NONE -> new MethodNote("Earth", data.frequencyHertz() == 0 ? "None: direct current."
                : "None: the field of the wires in free space.", "Biot-Savart law");
        };
    }

    private MethodNote shieldNote() {
        boolean carson = data.impedanceFormula() == ImpedanceFormula.CARSON;
        return new MethodNote("Shield wires", "Bonded shield wires carry I_s = -Z_ss^-1 Z_sp I_p, with series impedances per metre of parallel wires "
            + "at their mean heights and offsets, for a long line bonded at every structure; footing resistances and line ends are left out. "
            + "Resistances: " + resistances() + ".", carson ? "Carson, Bell System Technical Journal 5, 1926"
            : "Deri, Tevan, Semlyen, Castanheira, IEEE Trans. PAS-100 no. 8, 1981");
    }

    private String resistances() {
        Set<String> texts = new LinkedHashSet<>();
        for (LineData line : data.lines()) {
            for (ElementData element : line.elements()) {
                if (element.bonding() == BondingData.BONDED) {
                    ConductorData c = element.conductor();
                    texts.add(c.name() + " " + Texts.number(1000 * c.resistance()) + " ohm/km at " + Texts.number(c.resistanceTemperature())
                        + " degrees C");
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
            notices.add(Notice.information(data.electricLimits() == 1 ? "One limit for the electric field was not compared."
                : data.electricLimits() + " limits for the electric field were not compared."));
        }
        return notices;
    }

    private void addEarthNotices(List<Notice> notices, double lowest) {
        if (data.frequencyHertz() == 0) {
            notices.add(Notice.information("Direct current: the static field of the earth itself is not included, nothing is induced in shield "
                + "wires, and the field of current that returns in the earth is left out. There is no model error to estimate."));
        } else if (data.earthModel() == EarthModel.NONE) {
            notices.add(Notice.information("No earth model is active, so that no model error can be estimated."));
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
                    notices.add(Notice.warning("Load case '" + table.loadCase().name() + "': " + Texts.number(split.earth().magnitude())
                        + " A return outside the wires of " + String.join(", ", split.lines())
                        + ". Without an earth model the field of that return is missing, and values far from the line are too high or too low."));
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
            notices.add(Notice.warning("Some field points lie so far below the earth plane at " + Texts.number(study.earthPlane())
                + " m, the mean ground level under the lines, that the earth's part of the field is taken at a substitute height there."));
        }
        boolean ends = data.lines().stream().anyMatch(l -> l.start() == WireEnd.ENDS || l.finish() == WireEnd.ENDS);
        if (data.earthModel() == EarthModel.EXACT_HALF_SPACE && ends) {
            notices.add(Notice.information("The exact half-space correction takes wires that end as endless ones; complex images end with them. "
                + "Compare with complex images near and beyond a dead end."));
        }
        if (data.earthModel() == EarthModel.EXACT_HALF_SPACE && turn > NOTABLE_TURN_DEGREES) {
            notices.add(Notice.information("Wires turn by up to " + Texts.number(turn) + " degrees from their mean direction: the exact half-space "
                + "correction is taken along the mean direction, the complex image along the true path."));
        }
    }

    private void addCouplingNotices(List<Notice> notices) {
        if (!inductionUsed()) {
            return;
        }
        for (Uncoupled pair : study.groups().uncoupled()) {
            boolean matters = data.lines().stream().anyMatch(l -> bonded(l) && (l.name().equals(pair.first()) || l.name().equals(pair.second())));
            if (matters) {
                notices.add(Notice.information("Lines '" + pair.first() + "' and '" + pair.second() + "' run at "
                    + Texts.number(pair.angleDegrees()) + " degrees to each other and are not coupled in the induced shield-wire currents: "
                    + "only lines within " + Texts.number(ParallelGroups.GREATEST_ANGLE_DEGREES) + " degrees are."));
            }
        }
    }
}
