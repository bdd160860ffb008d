/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import spanfield.model.SpanfieldFactory;
import spanfield.model.Survey;
import spanfield.model.SurveyReading;

/**
 * Reads measured surveys from comma-separated values: a header that names the unit of each column, station_m, offset_m, height_m (or _ft;
 * height may be left out: 1 m) and resultant_uT or resultant_mG, then a line for each reading. Other columns are ignored.
 */
public final class SurveyCsv {

    private static final double FOOT = 0.3048;
    private static final double MICROTESLA = 1e-6;
    private static final double MILLIGAUSS = 1e-7;
    private static final Map<String, Double> UNITS = Map.of("m", 1.0, "ft", FOOT, "ut", MICROTESLA, "mg", MILLIGAUSS);
    private static final Set<String> LENGTHS = Set.of("station", "offset", "height");
    private static final int MOST_PROBLEMS = 5;

    private SurveyCsv() {
    }

    /**
     * A survey from the text of a file.
     *
     * @param text content of the file; a byte-order mark is allowed
     * @param name name for the survey
     * @throws StudyInputException with the line numbers of bad rows; nothing is read then
     */
    public static Survey read(String text, String name) {
        List<String> lines = text.replace("\uFEFF", "").lines().toList();
        if (lines.isEmpty() || lines.get(0).isBlank()) {
            throw new StudyInputException("The survey is empty; its first line names the columns, such as station_m,offset_m,height_m,resultant_uT.");
        }
        Map<String, Column> columns = columns(lines.get(0));
        Survey survey = SpanfieldFactory.eINSTANCE.createSurvey();
        survey.setName(name);
        List<String> problems = new ArrayList<>();
        for (int i = 1; i < lines.size(); i++) {
            if (!lines.get(i).isBlank()) {
                readRow(lines.get(i).split(",", -1), i + 1, columns, survey, problems);
            }
        }
        if (!problems.isEmpty()) {
            String more = problems.size() > MOST_PROBLEMS ? " And " + (problems.size() - MOST_PROBLEMS) + " more." : "";
            throw new StudyInputException(String.join(" ", problems.subList(0, Math.min(MOST_PROBLEMS, problems.size()))) + more);
        }
        if (survey.getReadings().isEmpty()) {
            throw new StudyInputException("The survey has a header but no readings.");
        }
        return survey;
    }

    /** Place and factor of a column. */
    private record Column(int index, double factor) {
    }

    private static Map<String, Column> columns(String header) {
        Map<String, Column> columns = new LinkedHashMap<>();
        String[] names = header.split(",", -1);
        for (int i = 0; i < names.length; i++) {
            String column = names[i].strip().replace("\"", "").toLowerCase(Locale.ROOT);
            int bar = column.lastIndexOf('_');
            if (bar < 0) {
                continue;
            }
            String quantity = column.substring(0, bar);
            Double factor = UNITS.get(column.substring(bar + 1));
            boolean length = LENGTHS.contains(quantity);
            if (factor != null && (length && factor > 0.1 || quantity.equals("resultant") && factor < 0.1)) {
                columns.put(quantity, new Column(i, factor));
            }
        }
        for (String needed : List.of("station", "offset", "resultant")) {
            if (!columns.containsKey(needed)) {
                throw new StudyInputException("The survey has no column " + needed + " with a unit; its first line must name station_m, offset_m and "
                    + "resultant_uT (or _ft and _mG), and may name height_m.");
            }
        }
        return columns;
    }

    private static void readRow(String[] cells, int line, Map<String, Column> columns, Survey survey, List<String> problems) {
        SurveyReading reading = SpanfieldFactory.eINSTANCE.createSurveyReading();
        for (Map.Entry<String, Column> entry : columns.entrySet()) {
            Column column = entry.getValue();
            String cell = column.index() < cells.length ? cells[column.index()].strip().replace("\"", "") : "";
            double value;
            try {
                value = Double.parseDouble(cell) * column.factor();
            } catch (NumberFormatException notANumber) {
                value = Double.NaN;
            }
            if (!Double.isFinite(value) || entry.getKey().equals("resultant") && value < 0) {
                problems.add("Line " + line + ": '" + cell + "' is no " + entry.getKey() + ".");
                return;
            }
            switch (entry.getKey()) {
                case "station" -> reading.setStationMetres(value);
                case "offset" -> reading.setOffsetMetres(value);
                case "height" -> reading.setHeightMetres(value);
                default -> reading.setResultantTesla(value);
            }
        }
        survey.getReadings().add(reading);
    }
}
