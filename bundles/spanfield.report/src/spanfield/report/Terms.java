/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import spanfield.model.FieldMeasure;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;
import spanfield.solver.earth.EarthModel;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.Evidence;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.StationInfo;

/** Words for the choices of a study, the same in tables and plots. */
public final class Terms {

    private Terms() {
    }

    /** A measure of the field. */
    public static String measure(FieldMeasure measure) {
        return measure == FieldMeasure.MAJOR_AXIS ? "major semi-axis" : "resultant";
    }

    /** Where a limit applies. */
    public static String place(LimitPlace place) {
        return switch (place) {
            case EDGE -> "at the edges";
            case WITHIN -> "within the right-of-way";
            case EVERYWHERE -> "everywhere on the profile";
        };
    }

    /** How the level of a limit is known. */
    public static String basis(LimitBasis basis) {
        return switch (basis) {
            case CONFIRMED -> "confirmed against its source";
            case FROM_MEMORY -> "from memory: confirm it before use";
            case USER -> "chosen by the author of the study";
        };
    }

    /** A station: its name where it has one, and where it is. */
    public static String station(StationInfo station, Units units) {
        String at = Numbers.brief(units.length().fromMetres(station.stationMetres()), Numbers.LENGTH_DECIMALS) + " " + units.length().code();
        return station.name().isBlank() ? "Station " + at : "Station '" + station.name() + "' at " + at;
    }

    /** A load case with its basis and wind. */
    public static String loadCase(CaseInfo loadCase, TextStyle style) {
        String basis = loadCase.basis().isBlank() ? "" : " (" + loadCase.basis() + ")";
        double swing = Math.toDegrees(loadCase.windSwingRadians());
        String wind = swing == 0 ? "" : ", wires swung by " + Numbers.brief(swing, 2) + style.degrees();
        return loadCase.name() + basis + wind;
    }

    /** A limit in one line: level, measure, place, origin. */
    public static String limit(LimitInfo limit, ReportOptions options) {
        StringBuilder text = new StringBuilder(limit.name()).append(": ")
            .append(Numbers.stated(options.field(limit.levelTesla()))).append(' ').append(options.fieldSymbol())
            .append(", ").append(measure(limit.measure())).append(", ").append(place(limit.place()));
        append(text, "; ", limit.body());
        append(text, limit.body().isBlank() ? "; " : ", ", limit.edition());
        append(text, "; load: ", limit.loadCondition());
        return text.append("; ").append(basis(limit.basis())).toString();
    }

    private static void append(StringBuilder text, String before, String part) {
        if (!part.isBlank()) {
            text.append(before).append(part);
        }
    }

    /** The earth model of a result with its parameter. */
    public static String earth(Evidence evidence, TextStyle style) {
        String resistivity = Numbers.stated(evidence.earthResistivityOhmMetres()) + " " + style.ohmMetres();
        if (evidence.earthModel() == EarthModel.COMPLEX_IMAGES) {
            return "complex images, " + resistivity;
        }
        if (evidence.earthModel() == EarthModel.EXACT_HALF_SPACE) {
            return "exact half-space, " + resistivity;
        }
        return evidence.frequencyHertz() == 0 ? "none (direct current)" : "none (no current in the earth is modelled)";
    }

    /** The frequency of a result. */
    public static String frequency(Evidence evidence) {
        return evidence.frequencyHertz() == 0 ? "direct current" : Numbers.stated(evidence.frequencyHertz()) + " Hz";
    }
}
