/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import spanfield.study.StudyInputException;
import spanfield.study.internal.Messages;

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
        require(Messages.text("request.coordinate.station"), stationMetres);
        require(Messages.text("request.coordinate.from"), fromOffsetMetres);
        require(Messages.text("request.coordinate.to"), toOffsetMetres);
        if (!(toOffsetMetres > fromOffsetMetres)) {
            throw new StudyInputException(Messages.text("request.offsets", stationMetres, fromOffsetMetres, toOffsetMetres));
        }
        if (!(spacingMetres > 0) || (toOffsetMetres - fromOffsetMetres) / spacingMetres > GREATEST_POINT_COUNT - 1) {
            throw new StudyInputException(Messages.text("request.spacing", stationMetres, spacingMetres, GREATEST_POINT_COUNT));
        }
    }

    private static void require(String what, double value) {
        if (!(Math.abs(value) <= GREATEST_COORDINATE_METRES)) {
            throw new StudyInputException(Messages.text("request.coordinate", what, value, -GREATEST_COORDINATE_METRES, GREATEST_COORDINATE_METRES));
        }
    }

    /** A station that is not in the study file. */
    public static StationInfo at(double stationMetres, double fromOffsetMetres, double toOffsetMetres, double spacingMetres) {
        return new StationInfo("", "", stationMetres, fromOffsetMetres, toOffsetMetres, spacingMetres);
    }
}
