/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import spanfield.model.FieldMeasure;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.Units;
import spanfield.solver.earth.EarthModel;

/**
 * What the options of a computing verb ask for.
 *
 * @param units    units of the output
 * @param measure  scalar of the field in text and plots
 * @param csv      whether the output is CSV
 * @param earth    earth model instead of the study's
 * @param accuracy relative accuracy instead of the study's
 * @param cases    load cases by identifier or name; all when empty
 */
record Settings(Units units, FieldMeasure measure, boolean csv, Optional<EarthModel> earth, Optional<Double> accuracy, List<String> cases) {

    private static final Map<String, FieldUnit> FIELD_UNITS = Map.of("uT", FieldUnit.MICROTESLA, "mG", FieldUnit.MILLIGAUSS);
    private static final Map<String, LengthUnit> LENGTH_UNITS = Map.of("m", LengthUnit.METRE, "ft", LengthUnit.FOOT);
    private static final Map<String, FieldMeasure> MEASURES = Map.of("resultant", FieldMeasure.RESULTANT, "major", FieldMeasure.MAJOR_AXIS);
    private static final Map<String, EarthModel> EARTH_MODELS =
        new TreeMap<>(Map.of("none", EarthModel.NONE, "images", EarthModel.COMPLEX_IMAGES, "exact", EarthModel.EXACT_HALF_SPACE));
    private static final Map<String, Boolean> FORMATS = Map.of("text", false, "csv", true);

    static Settings of(Args args) {
        Units units = new Units(args.choice(Args.UNITS, FIELD_UNITS).orElse(FieldUnit.MICROTESLA),
            args.choice(Args.LENGTH, LENGTH_UNITS).orElse(LengthUnit.METRE));
        return new Settings(units, args.choice(Args.MEASURE, MEASURES).orElse(FieldMeasure.RESULTANT), csv(args),
            args.choice(Args.EARTH, EARTH_MODELS), args.value(Args.ACCURACY).map(Settings::accuracy), args.all(Args.CASE));
    }

    /** Whether CSV is asked for. */
    static boolean csv(Args args) {
        return args.choice(Args.FORMAT, FORMATS).orElse(false);
    }

    private static double accuracy(String text) {
        return number(text).orElseThrow(() -> CommandException.argument("--accuracy '" + text + "' is not a number; give one from 1e-12 to 1e-2"));
    }

    /** A finite decimal number; empty for anything else. */
    static Optional<Double> number(String text) {
        try {
            double value = Double.parseDouble(text);
            boolean decimal = text.chars().allMatch(c -> "+-.0123456789eE".indexOf(c) >= 0);
            return decimal && Double.isFinite(value) ? Optional.of(value) : Optional.empty();
        } catch (NumberFormatException other) {
            return Optional.empty();
        }
    }
}
