/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.study.CorridorPlan;
import spanfield.study.GeometryRule;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.SectionData;
import spanfield.study.internal.StudyData.StringingRule;

/**
 * Finds the catenary constants of the wires that share a stringing rule in a section.
 *
 * <ul>
 * <li>Constant: as given. Tension: c = H / (m g), g = 9.80665 m/s2.
 * <li>Sag: the constant that gives the wire the sag in its longest span of the section; its other spans share the constant.
 * <li>Clearance: one constant for all wires of the rule, so that the lowest of them comes as near to the ground as given, somewhere in the
 * section, without wind. The clearance falls steadily with 1/c, the root is found by Brent's method.
 * </ul>
 */
final class Stringer {

    /** The clearance is met to this tolerance in metres, far below surveying. */
    static final double CLEARANCE_TOLERANCE_METRES = 1e-9;

    /** What a wire that cannot hang counts as in the search: far below ground. */
    private static final double IMPOSSIBLE = -1e6;

    private final LineData line;
    private final SectionData section;
    private final StringingRule rule;
    private final CorridorPlan plan;
    private final List<GeometryProblem> problems;
    private final List<Member> members = new ArrayList<>();

    private record Member(ElementData element, Position[] attachments, double[] constants) {
    }

    Stringer(LineData line, SectionData section, StringingRule rule, CorridorPlan plan, List<GeometryProblem> problems) {
        this.line = line;
        this.section = section;
        this.rule = rule;
        this.plan = plan;
        this.problems = problems;
    }

    /** Adds a wire; its constants of the section are filled in by {@link #string}. */
    void add(ElementData element, Position[] attachments, double[] constants) {
        members.add(new Member(element, attachments, constants));
    }

    void string() {
        if (rule.kind() == StringingRule.Kind.CLEARANCE) {
            stringByClearance();
            return;
        }
        for (Member member : members) {
            double constant = switch (rule.kind()) {
                case CONSTANT -> rule.value();
                case TENSION -> rule.value() / (member.element.conductor().mass() * PhysicalConstants.STANDARD_GRAVITY);
                default -> constantForSag(member);
            };
            if (Double.isNaN(constant) || !fits(member, constant)) {
                return;
            }
            fill(member, constant);
        }
    }

    private void fill(Member member, double constant) {
        java.util.Arrays.fill(member.constants, section.fromStructure(), section.toStructure(), constant);
    }

    private double constantForSag(Member member) {
        int span = LineBuilder.longestSpan(member.attachments, section.fromStructure(), section.toStructure());
        Position a = member.attachments[span];
        Position b = member.attachments[span + 1];
        try {
            return CatenarySpan.constantForMidspanSag(a.planDistanceTo(b), b.z() - a.z(), rule.value());
        } catch (SolverInputException refused) {
            problems.add(new GeometryProblem(GeometryRule.STRINGING_SAG_FITS_SPAN, rule.key(),
                Messages.text("Stringing_SagFitsSpan", rule.value(), spanName(span), a.planDistanceTo(b))));
            return Double.NaN;
        }
    }

    /** Whether every span of the section can hang with the constant; reports the first that cannot. */
    private boolean fits(Member member, double constant) {
        for (int i = section.fromStructure(); i < section.toStructure(); i++) {
            Position a = member.attachments[i];
            Position b = member.attachments[i + 1];
            try {
                CatenarySpan.ofConstant(a, b, constant, 0);
            } catch (SolverInputException refused) {
                problems.add(new GeometryProblem(GeometryRule.STRINGING_CONSTANT_FITS_SPANS, rule.key(),
                    Messages.text("Stringing_ConstantFitsSpans", member.element.name(), constant, spanName(i), a.planDistanceTo(b),
                        b.z() - a.z())));
                return false;
            }
        }
        return true;
    }

    private String spanName(int span) {
        return Messages.text("span", structure(span), structure(span + 1), line.name());
    }

    private void stringByClearance() {
        double straight = clearance(0);
        double slackest = slackestCurvature();
        double lowest = clearance(slackest);
        if (!(straight > rule.value() && lowest < rule.value())) {
            String from = structure(section.fromStructure());
            String to = structure(section.toStructure());
            problems.add(new GeometryProblem(GeometryRule.STRINGING_CLEARANCE_REACHABLE, rule.key(), straight <= rule.value()
                ? Messages.text("Stringing_ClearanceReachable.high", rule.value(), from, to, line.name(), straight)
                : Messages.text("Stringing_ClearanceReachable.low", rule.value(), from, to, line.name())));
            return;
        }
        double curvature = new BrentSolver(1e-15, 1e-18, CLEARANCE_TOLERANCE_METRES / 10).solve(500,
            u -> clearance(u) - rule.value(), 0, slackest);
        for (Member member : members) {
            if (!fits(member, 1 / curvature)) {
                return;
            }
            fill(member, 1 / curvature);
        }
    }

    private String structure(int index) {
        return line.structures().get(index).name();
    }

    /** Greatest 1/c in 1/m at which the longest span can still hang; a little less, to stay clear of the limit itself. */
    private double slackestCurvature() {
        double longest = 0;
        for (Member member : members) {
            for (int i = section.fromStructure(); i < section.toStructure(); i++) {
                longest = Math.max(longest, member.attachments[i].planDistanceTo(member.attachments[i + 1]));
            }
        }
        return 0.999 * 2 * CatenarySpan.GREATEST_HALF_SPAN_RATIO / longest;
    }

    /** Least clearance in metres of all wires in the section for a curvature 1/c. */
    private double clearance(double curvature) {
        double least = Double.POSITIVE_INFINITY;
        for (Member member : members) {
            StrungConductor shape = new StrungConductor(line, member.element, 0, member.attachments, member.constants);
            for (int i = section.fromStructure(); i < section.toStructure(); i++) {
                CatenarySpan span;
                try {
                    span = CatenarySpan.ofConstant(member.attachments[i], member.attachments[i + 1],
                        curvature == 0 ? Double.POSITIVE_INFINITY : 1 / curvature, 0);
                } catch (SolverInputException tooSlack) {
                    return IMPOSSIBLE;
                }
                least = Math.min(least, GroundClearance.of(span, shape.bundleDrop(), shape.bundleHalfWidth(), plan).metres());
            }
        }
        return least;
    }
}
