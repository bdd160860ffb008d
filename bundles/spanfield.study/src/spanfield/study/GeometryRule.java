/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import spanfield.model.validation.Severity;

/**
 * Rules of a study that need the wires in space. Each is named by what should hold; the names are those of the findings. They are run by
 * {@link StudyCheck} once the rules of the model hold.
 */
public enum GeometryRule {

    /** A structure with a given turn faces along its line, so that right and left stay right and left. */
    STRUCTURE_FACES_ALONG_LINE("Structure_FacesAlongLine", Severity.ERROR),
    /** A line does not fold back upon itself at a structure. */
    STRUCTURE_TURN_NOT_FOLDING_BACK("Structure_TurnNotFoldingBack", Severity.ERROR),
    /** Every wire hangs above the ground at its structures. */
    STRUCTURE_WIRES_ABOVE_GROUND("Structure_WiresAboveGround", Severity.ERROR),
    /** The catenary constant is large enough for the spans and their rise. */
    STRINGING_CONSTANT_FITS_SPANS("Stringing_ConstantFitsSpans", Severity.ERROR),
    /** The sag is one that a wire can have in the span. */
    STRINGING_SAG_FITS_SPAN("Stringing_SagFitsSpan", Severity.ERROR),
    /** The clearance lies between what the straight and the slackest wire leave. */
    STRINGING_CLEARANCE_REACHABLE("Stringing_ClearanceReachable", Severity.ERROR),
    /** No wire touches the ground. */
    SPAN_WIRES_ABOVE_GROUND("Span_WiresAboveGround", Severity.ERROR),
    /** Phases keep a usual clearance to the ground. */
    SPAN_CLEARANCE_USUAL("Span_ClearanceUsual", Severity.WARNING),
    /** No wire passes through another. */
    WIRES_APART("Wires_Apart", Severity.ERROR),
    /** Wires keep a usual distance from each other. */
    WIRES_DISTANCE_USUAL("Wires_DistanceUsual", Severity.WARNING),
    /** No point of a profile lies in a wire. */
    STATION_POINTS_OUTSIDE_WIRES("Station_PointsOutsideWires", Severity.ERROR),
    /** The wires of a line go on beyond its structures, so that their current paths are closed. */
    LINE_CURRENT_PATH_CLOSED("Line_CurrentPathClosed", Severity.WARNING),
    /** Wires hang, on average, above the one earth plane of the study. */
    STUDY_EARTH_PLANE_BELOW_WIRES("Study_EarthPlaneBelowWires", Severity.ERROR),
    /** Complex images exist for every wire at every point of the profiles. */
    STUDY_EARTH_IMAGE_DEFINED("Study_EarthImageDefined", Severity.ERROR);

    private final String ruleName;
    private final Severity severity;

    GeometryRule(String ruleName, Severity severity) {
        this.ruleName = ruleName;
        this.severity = severity;
    }

    /** Name of the rule in findings. */
    public String ruleName() {
        return ruleName;
    }

    /** Severity of its findings. */
    public Severity severity() {
        return severity;
    }
}
