/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanfield.model.FieldMeasure;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.FieldValue;
import spanfield.study.result.Phasor;

/** Columns of field values, the same in every CSV table. */
final class FieldCsv {

    /** Names of the columns of {@link #value}, without unit. */
    static final List<String> VALUE_COLUMNS = List.of("resultant", "major_axis", "minor_axis", "numerical_error", "model_error");

    /** Names of the columns of {@link #components}, without unit. */
    static final List<String> COMPONENT_COLUMNS = List.of("bx_real", "bx_imaginary", "by_real", "by_imaginary", "bz_real", "bz_imaginary");

    private FieldCsv() {
    }

    /** The measures of a field value in the field unit. */
    static List<Object> value(FieldValue value, Units units) {
        FieldUnit unit = units.field();
        return List.of(unit.fromTesla(value.resultantTesla()), unit.fromTesla(value.majorAxisTesla()), unit.fromTesla(value.minorAxisTesla()),
            unit.fromTesla(value.numericalErrorTesla()), unit.fromTesla(value.modelErrorTesla()));
    }

    /** The plan components of a point of a series in the field unit. */
    static List<Object> components(FieldSeries series, int point, Units units) {
        List<Object> fields = new ArrayList<>();
        for (int c = 0; c < 3; c++) {
            Phasor phasor = series.component(c, point);
            fields.add(units.field().fromTesla(phasor.real()));
            fields.add(units.field().fromTesla(phasor.imaginary()));
        }
        return fields;
    }

    /** Header names with the field unit. */
    static List<String> header(List<String> columns, Units units) {
        return columns.stream().map(column -> column + "_" + units.field().code()).toList();
    }

    /** A measure as a word for programs. */
    static String name(FieldMeasure measure) {
        return measure.name().toLowerCase(Locale.ROOT);
    }
}
