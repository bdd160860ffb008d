/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.Arrays;
import java.util.Comparator;
import spanfield.model.FieldMeasure;
import spanfield.report.Numbers;
import spanfield.report.Units;
import spanfield.study.CorridorPlan;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.ProfileCase;
import spanfield.study.result.StationGeometry.WireAtStation;

/** What is read at a place of the cross-section: where it is, how far from the nearest wire, and the field above the ground there. */
public final class SectionReading {

    private SectionReading() {
    }

    /**
     * The reading in words.
     *
     * @param profile   newest profile at the station, or null: then only the place is told
     * @param station   station in metres
     * @param offset    offset of the place in metres
     * @param elevation elevation of the place in metres
     */
    public static String at(CorridorPlan plan, LateralProfile profile, double station, double offset, double elevation, Units units) {
        String text = "Offset " + length(offset, units, 1) + ", " + length(elevation - plan.groundElevation(station, offset), units, 1)
            + " above ground";
        if (profile == null || profile.cases().isEmpty()) {
            return text;
        }
        ProfileCase first = profile.cases().get(0);
        return text + wireText(first, offset, elevation, units) + fieldText(profile, first, offset, units);
    }

    private static String wireText(ProfileCase loadCase, double offset, double elevation, Units units) {
        WireAtStation nearest = loadCase.geometry().wires().stream().min(Comparator.comparingDouble(w -> distance(w, offset, elevation)))
            .orElse(null);
        if (nearest == null) {
            return "";
        }
        String name = (nearest.shieldWire() ? "" : "phase " + nearest.phase() + " of ") + "'" + nearest.element() + "'";
        return ", " + length(distance(nearest, offset, elevation), units, 1) + " from " + name + " in this plane";
    }

    private static double distance(WireAtStation wire, double offset, double elevation) {
        return Math.hypot(wire.offsetMetres() - offset, wire.elevationMetres() - elevation);
    }

    private static String fieldText(LateralProfile profile, ProfileCase loadCase, double offset, Units units) {
        double tesla = field(profile.offsetsMetres(), loadCase.series(), offset);
        return Double.isNaN(tesla) ? "" : ".   Field there at " + Numbers.stated(units.length().fromMetres(profile.referenceHeightMetres())) + " "
            + units.length().code() + ": " + Numbers.field(units.field().fromTesla(tesla)) + " " + units.field().symbol() + " ("
            + loadCase.loadCase().name() + ")";
    }

    private static String length(double metres, Units units, int decimals) {
        return Numbers.fixed(units.length().fromMetres(metres), decimals) + " " + units.length().code();
    }

    /**
     * Resultant at an offset, linear between the points of a profile.
     *
     * @param offsets offsets of the points in metres, rising
     * @param offset  offset in metres
     * @return tesla RMS; NaN beyond the profile
     */
    public static double field(double[] offsets, FieldSeries series, double offset) {
        if (offsets.length == 0 || !(offset >= offsets[0] && offset <= offsets[offsets.length - 1])) {
            return Double.NaN;
        }
        int found = Arrays.binarySearch(offsets, offset);
        if (found >= 0) {
            return series.value(found).tesla(FieldMeasure.RESULTANT);
        }
        int right = -found - 1;
        double share = (offset - offsets[right - 1]) / (offsets[right] - offsets[right - 1]);
        return (1 - share) * series.value(right - 1).tesla(FieldMeasure.RESULTANT) + share * series.value(right).tesla(FieldMeasure.RESULTANT);
    }
}
