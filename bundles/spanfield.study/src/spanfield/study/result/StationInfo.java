/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import spanfield.study.StudyInputException;

/**
 * A station with the extent of its lateral profile.
 *
 * @param id               identifier in the study file; empty for a station that is not in it
 * @param name             name for people
 * @param stationMetres    station in metres
 * @param fromOffsetMetres first offset of the profile in metres
 * @param toOffsetMetres   last offset of the profile in metres, greater than the first
 * @param spacingMetres    distance between the points of the profile in metres, positive
 */
public record StationInfo(String id, String name, double stationMetres, double fromOffsetMetres, double toOffsetMetres,
    double spacingMetres) {

    /** Greatest number of points of one profile: beyond it the spacing is mistaken. */
    public static final int GREATEST_POINT_COUNT = 100_001;

    /** Greatest magnitude of a station or offset in metres. */
    public static final double GREATEST_COORDINATE_METRES = 1e5;

    public StationInfo {
        require("station in metres", stationMetres);
        require("first offset of the profile in metres", fromOffsetMetres);
        require("last offset of the profile in metres", toOffsetMetres);
        if (!(toOffsetMetres > fromOffsetMetres)) {
            throw new StudyInputException("The profile at station " + stationMetres + " m goes from offset " + fromOffsetMetres + " m to "
                + toOffsetMetres + " m; let the last offset be greater than the first");
        }
        if (!(spacingMetres > 0) || (toOffsetMetres - fromOffsetMetres) / spacingMetres > GREATEST_POINT_COUNT - 1) {
            throw new StudyInputException("The profile at station " + stationMetres + " m has a spacing of " + spacingMetres
                + " m; give a positive spacing that leaves at most " + GREATEST_POINT_COUNT + " points");
        }
    }

    private static void require(String what, double value) {
        if (!(Math.abs(value) <= GREATEST_COORDINATE_METRES)) {
            throw new StudyInputException("The " + what + " is " + value + "; give a number between " + -GREATEST_COORDINATE_METRES + " and "
                + GREATEST_COORDINATE_METRES);
        }
    }

    /** A station that is not in the study file. */
    public static StationInfo at(double stationMetres, double fromOffsetMetres, double toOffsetMetres, double spacingMetres) {
        return new StationInfo("", "", stationMetres, fromOffsetMetres, toOffsetMetres, spacingMetres);
    }
}
