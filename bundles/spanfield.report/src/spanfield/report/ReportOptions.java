/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.Objects;
import spanfield.model.FieldMeasure;

/**
 * How a report for people is written. Neither choice changes what is computed.
 *
 * @param units     units of all numbers
 * @param measure   scalar of the field that tables show
 * @param style     signs that the output can carry
 * @param studyFile name of the study file for the header; empty for none
 */
public record ReportOptions(Units units, FieldMeasure measure, TextStyle style, String studyFile) {

    /** Microtesla, metres, resultant, without file name. */
    public static final ReportOptions DEFAULT =
        new ReportOptions(Units.SI, FieldMeasure.RESULTANT, TextStyle.UNICODE, "");

    public ReportOptions {
        Objects.requireNonNull(units);
        Objects.requireNonNull(measure);
        Objects.requireNonNull(style);
        Objects.requireNonNull(studyFile);
    }

    String fieldSymbol() {
        return style.symbol(units.field());
    }

    String lengthSymbol() {
        return units.length().code();
    }

    /** A field value in the chosen unit. */
    double field(double tesla) {
        return units.field().fromTesla(tesla);
    }

    /** A length in the chosen unit. */
    double length(double metres) {
        return units.length().fromMetres(metres);
    }
}
