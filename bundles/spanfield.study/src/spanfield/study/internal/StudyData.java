/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.List;
import java.util.Map;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.line.ImpedanceFormula;
import spanfield.solver.geometry.WireEnd;
import spanfield.study.CorridorPlan;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.StationInfo;

/**
 * A study read out of its model into plain immutable values: SI units, angles in radians, references resolved to indices. NaN stands for
 * an optional number that the study leaves out.
 *
 * @param plan           corridor in plan, ground and edges
 * @param lines          lines in the order of the study
 * @param cases          load cases in the order of the study
 * @param limits         limits for the magnetic field
 * @param electricLimits number of limits for the electric field, which are not compared
 */
public record StudyData(String id, String name, double frequencyHertz, double resistivity, EarthModel earthModel,
    ImpedanceFormula impedanceFormula, double referenceHeight, double relativeAccuracy, CorridorPlan plan, List<LineData> lines,
    List<CaseData> cases, List<StationData> stations, List<LimitInfo> limits, int electricLimits) {

    /** A station and its place in the model. */
    public record StationData(String key, StationInfo info) {
    }

    /** A line. Keys name places in the model for findings. */
    public record LineData(String key, int index, String name, List<StructureData> structures, List<SectionData> sections,
        List<ElementData> elements, WireEnd start, WireEnd finish) {

        int spanCount() {
            return structures.size() - 1;
        }
    }

    /** A structure; attachments by name, offset to the right and height of the wire above the base, extension and insulator included. */
    public record StructureData(String key, String name, double station, double offset, double baseElevation, double turn,
        Map<String, AttachmentData> attachments) {
    }

    /** Where a wire hangs on a structure: offset to the right of the axis and height above the base, in metres. */
    public record AttachmentData(double offset, double height) {
    }

    /** How tightly a group of wires hangs; the unit of the value depends on the kind. */
    public record StringingRule(String key, Kind kind, double value) {

        /** Kinds of rules and the units of their values. */
        public enum Kind {
            /** Catenary constant in metres. */
            CONSTANT,
            /** Sag at mid-span of the longest span in metres. */
            SAG,
            /** Horizontal tension in newtons. */
            TENSION,
            /** Least clearance to the ground in metres. */
            CLEARANCE
        }
    }

    /** Consecutive spans and the rule of every element of the line in them: one rule object for the wires that share it. */
    public record SectionData(String key, int fromStructure, int toStructure, Map<Integer, StringingRule> ruleOfElement) {
    }

    /** A circuit or shield wire. */
    public record ElementData(String key, int index, String id, String name, ConductorData conductor, int bundleCount, double bundleSpacing,
        double nominalVoltage, List<PhaseData> phases, boolean shield, BondingData bonding, Complex givenCurrent) {

        /** Radius of the circle through the subconductors: s / (2 sin(pi / n)); 0 for a single conductor. */
        public double bundleRadius() {
            return bundleCount < 2 ? 0 : bundleSpacing / (2 * Math.sin(Math.PI / bundleCount));
        }
    }

    /** How a shield wire is connected. */
    public enum BondingData {
        /** Not a shield wire. */
        NONE,
        /** Bonded to earth at every structure. */
        BONDED,
        /** Insulated or segmented. */
        INSULATED,
        /** Carries a given current. */
        GIVEN
    }

    /** A phase, or the one wire of a shield wire (with an empty label). */
    public record PhaseData(String label, double angle, String attachment) {
    }

    /** A conductor of the catalogue. */
    public record ConductorData(String name, double radius, double geometricMeanRadius, double resistance, double resistanceTemperature,
        double mass) {
    }

    /** A load case: phasors of every circuit that carries a load, [line, element] to current of each phase in amperes RMS. */
    public record CaseData(String key, CaseInfo info, Map<ElementRef, Complex[]> currents) {
    }

    /** A circuit or shield wire by line index and element index. */
    public record ElementRef(int line, int element) {
    }
}
