/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import spanfield.solver.geometry.Position;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.PlanPoint;
import spanfield.study.GeometryRule;
import spanfield.study.internal.StudyData.AttachmentData;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.PhaseData;
import spanfield.study.internal.StudyData.SectionData;
import spanfield.study.internal.StudyData.StringingRule;
import spanfield.study.internal.StudyData.StructureData;

/**
 * Places the structures of a line in plan and strings its wires: attachment positions and a catenary constant for every span, without
 * wind. Used once, for one line.
 *
 * <p>A structure faces along the bisector of its two spans, at the ends of the line along the one span, unless its turn is given. A wire
 * hangs straight below its attachment by the length of the insulator.
 */
final class LineBuilder {

    /** Greatest turn between two spans in degrees: beyond it the wires would run back along themselves. */
    static final double GREATEST_TURN_DEGREES = 150;

    private final LineData line;
    private final CorridorPlan plan;
    private final List<GeometryProblem> problems;
    private final Position[] bases;
    private final List<StrungConductor> conductors = new ArrayList<>();
    private final Map<PhaseRef, Position[]> attachments = new HashMap<>();

    private record PhaseRef(int element, int phase) {
    }

    /** Builds the line; what cannot be built is reported as problems. */
    LineBuilder(LineData line, CorridorPlan plan, List<GeometryProblem> problems) {
        this.line = line;
        this.plan = plan;
        this.problems = problems;
        this.bases = line.structures().stream().map(this::base).toArray(Position[]::new);
        int before = problems.size();
        checkTurns();
        if (problems.size() == before) {
            attach();
        }
        if (problems.size() == before) {
            string();
        }
    }

    /** Bases of the structures. */
    Position[] bases() {
        return bases.clone();
    }

    /** The strung phases and shield wires; incomplete where problems were reported. */
    List<StrungConductor> conductors() {
        return conductors;
    }

    private Position base(StructureData structure) {
        PlanPoint p = plan.planPoint(structure.station(), structure.offset());
        double z = Double.isNaN(structure.baseElevation()) ? plan.groundElevation(structure.station(), structure.offset())
            : structure.baseElevation();
        return new Position(p.x(), p.y(), z);
    }

    private void checkTurns() {
        for (int i = 1; i + 1 < bases.length; i++) {
            double turn = Math.toDegrees(angle(bases[i].x() - bases[i - 1].x(), bases[i].y() - bases[i - 1].y(),
                bases[i + 1].x() - bases[i].x(), bases[i + 1].y() - bases[i].y()));
            if (!(turn <= GREATEST_TURN_DEGREES)) {
                StructureData structure = line.structures().get(i);
                problems.add(new GeometryProblem(GeometryRule.STRUCTURE_TURN_NOT_FOLDING_BACK, structure.key(),
                    Messages.text("Structure_TurnNotFoldingBack", line.name(), turn, structure.name())));
            }
        }
    }

    private static double angle(double ax, double ay, double bx, double by) {
        return Math.abs(Math.atan2(ax * by - ay * bx, ax * bx + ay * by));
    }

    private void attach() {
        double[][] rights = facings();
        for (ElementData element : line.elements()) {
            for (int p = 0; p < element.phases().size(); p++) {
                Position[] positions = new Position[bases.length];
                for (int i = 0; i < bases.length; i++) {
                    positions[i] = attachment(element.phases().get(p), i, rights[i]);
                }
                attachments.put(new PhaseRef(element.index(), p), positions);
                checkAboveGround(element, positions);
            }
        }
    }

    /** Unit vectors to the right of every structure. */
    private double[][] facings() {
        double[][] rights = StrungConductor.mitredNormals(bases);
        for (int i = 0; i < rights.length; i++) {
            double length = Math.hypot(rights[i][0], rights[i][1]);
            rights[i][0] /= length;
            rights[i][1] /= length;
            StructureData structure = line.structures().get(i);
            if (!Double.isNaN(structure.turn())) {
                double[] given = {Math.cos(structure.turn()), -Math.sin(structure.turn())};
                if (!(given[0] * rights[i][0] + given[1] * rights[i][1] > 0)) {
                    problems.add(new GeometryProblem(GeometryRule.STRUCTURE_FACES_ALONG_LINE, structure.key(),
                        Messages.text("Structure_FacesAlongLine", structure.name(), line.name(), Math.toDegrees(structure.turn()))));
                }
                rights[i] = given;
            }
        }
        return rights;
    }

    private Position attachment(PhaseData phase, int structure, double[] right) {
        AttachmentData a = line.structures().get(structure).attachments().get(phase.attachment());
        Position base = bases[structure];
        return new Position(base.x() + a.offset() * right[0], base.y() + a.offset() * right[1], base.z() + a.height());
    }

    private void checkAboveGround(ElementData element, Position[] positions) {
        for (int i = 0; i < positions.length; i++) {
            double height = positions[i].z() - plan.groundElevationAt(positions[i].x(), positions[i].y());
            if (!(height > 0)) {
                StructureData structure = line.structures().get(i);
                problems.add(new GeometryProblem(GeometryRule.STRUCTURE_WIRES_ABOVE_GROUND, structure.key(),
                    Messages.text("Structure_WiresAboveGround", structure.name(), line.name(), element.name(), -height)));
            }
        }
    }

    // stringing

    private void string() {
        Map<PhaseRef, double[]> constants = new HashMap<>();
        attachments.keySet().forEach(ref -> constants.put(ref, new double[line.spanCount()]));
        int before = problems.size();
        for (SectionData section : line.sections()) {
            stringSection(section, constants);
        }
        if (problems.size() > before) {
            return;
        }
        for (ElementData element : line.elements()) {
            for (int p = 0; p < element.phases().size(); p++) {
                PhaseRef ref = new PhaseRef(element.index(), p);
                conductors.add(new StrungConductor(line, element, p, attachments.get(ref), constants.get(ref)));
            }
        }
    }

    private void stringSection(SectionData section, Map<PhaseRef, double[]> constants) {
        Map<StringingRule, List<ElementData>> groups = new IdentityHashMap<>();
        List<StringingRule> order = new ArrayList<>();
        for (ElementData element : line.elements()) {
            StringingRule rule = section.ruleOfElement().get(element.index());
            if (!groups.containsKey(rule)) {
                order.add(rule);
                groups.put(rule, new ArrayList<>());
            }
            groups.get(rule).add(element);
        }
        for (StringingRule rule : order) {
            Stringer stringer = new Stringer(line, section, rule, plan, problems);
            for (ElementData element : groups.get(rule)) {
                for (int p = 0; p < element.phases().size(); p++) {
                    stringer.add(element, attachments.get(new PhaseRef(element.index(), p)), constants.get(new PhaseRef(element.index(), p)));
                }
            }
            stringer.string();
        }
    }

    /** Longest span of a section by the structures' axes; the first of equals. */
    static int longestSpan(Position[] bases, int from, int to) {
        int longest = from;
        for (int i = from; i < to; i++) {
            if (bases[i].planDistanceTo(bases[i + 1]) > bases[longest].planDistanceTo(bases[longest + 1])) {
                longest = i;
            }
        }
        return longest;
    }

    @Override
    public String toString() {
        return line.name() + Arrays.toString(bases);
    }
}
