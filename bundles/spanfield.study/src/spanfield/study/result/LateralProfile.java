/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;

/**
 * The field across the corridor at a station, at the reference height above the local ground. Immutable.
 */
public final class LateralProfile {

    private final StationInfo station;
    private final double[] offsets;
    private final double[] ground;
    private final double leftEdge;
    private final double rightEdge;
    private final double referenceHeight;
    private final List<ProfileCase> cases;
    private final List<LimitInfo> limits;
    private final Evidence evidence;

    /**
     * @param station               the station
     * @param offsetsMetres         offsets of the points in metres, rising, [point]
     * @param groundMetres          ground elevation at the points in metres, [point]
     * @param leftEdgeMetres        offset of the left edge of the right-of-way in metres
     * @param rightEdgeMetres       offset of the right edge of the right-of-way in metres
     * @param referenceHeightMetres height of the points above the ground in metres
     * @param cases                 load cases in the order of the study
     * @param limits                limits of the study for the magnetic field
     * @param evidence              how the values came about
     */
    public LateralProfile(StationInfo station, double[] offsetsMetres, double[] groundMetres, double leftEdgeMetres, double rightEdgeMetres,
        double referenceHeightMetres, List<ProfileCase> cases, List<LimitInfo> limits, Evidence evidence) {
        this.station = station;
        this.offsets = offsetsMetres.clone();
        this.ground = groundMetres.clone();
        this.leftEdge = leftEdgeMetres;
        this.rightEdge = rightEdgeMetres;
        this.referenceHeight = referenceHeightMetres;
        this.cases = List.copyOf(cases);
        this.limits = List.copyOf(limits);
        this.evidence = evidence;
    }

    /** The station. */
    public StationInfo station() {
        return station;
    }

    /** Number of points. */
    public int size() {
        return offsets.length;
    }

    /** Offsets of the points in metres, rising, as a new array. */
    public double[] offsetsMetres() {
        return offsets.clone();
    }

    /** Ground elevation at the points in metres, as a new array. */
    public double[] groundElevationsMetres() {
        return ground.clone();
    }

    /** Offset of the left edge of the right-of-way in metres. */
    public double leftEdgeOffsetMetres() {
        return leftEdge;
    }

    /** Offset of the right edge of the right-of-way in metres. */
    public double rightEdgeOffsetMetres() {
        return rightEdge;
    }

    /** Height of the points above the local ground in metres. */
    public double referenceHeightMetres() {
        return referenceHeight;
    }

    /** Load cases in the order of the study. */
    public List<ProfileCase> cases() {
        return cases;
    }

    /** Limits of the study for the magnetic field. */
    public List<LimitInfo> limits() {
        return limits;
    }

    /** How the values came about. */
    public Evidence evidence() {
        return evidence;
    }
}
