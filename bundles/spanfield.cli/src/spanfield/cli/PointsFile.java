/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import spanfield.report.LengthUnit;
import spanfield.study.FieldPoint;

/**
 * Points read from CSV (RFC 4180, UTF-8): a header with the columns station, offset and height, each with its unit (station_m or
 * station_ft), and if wanted a column name. Other columns are ignored, and said to be.
 *
 * @param points  the points in the order of the file, in metres
 * @param names   name of each point, empty where there is none
 * @param lines   line of the file on which each point starts, from 1
 * @param ignored columns that are not used
 */
record PointsFile(List<FieldPoint> points, List<String> names, List<Integer> lines, List<String> ignored) {

    private static final List<String> QUANTITIES = List.of("station", "offset", "height");
    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?");

    /** Bad rows that are listed; the others are counted. */
    private static final int GREATEST_LISTED = 10;

    PointsFile {
        points = List.copyOf(points);
        names = List.copyOf(names);
        lines = List.copyOf(lines);
        ignored = List.copyOf(ignored);
    }

    /**
     * Reads points.
     *
     * @param source name of the source for messages
     * @throws CommandException with a line for every bad row
     */
    static PointsFile read(byte[] content, String source) {
        List<CsvRecords.Row> rows = new CsvRecords(text(content, source), source).rows();
        if (rows.isEmpty()) {
            throw CommandException.file(source + " is empty; its first line must be a header such as station_m,offset_m,height_m");
        }
        Header header = Header.of(rows.get(0), source);
        Reading reading = new Reading(header, source);
        rows.subList(1, rows.size()).forEach(reading::add);
        return reading.finish();
    }

    private static String text(byte[] content, String source) {
        try {
            String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(content)).toString();
            return text.startsWith("\ufeff") ? text.substring(1) : text;
        } catch (CharacterCodingException other) {
            throw CommandException.file(source + " is not UTF-8 text; save it as CSV in UTF-8");
        }
    }

    /**
     * Where the columns are.
     *
     * @param columns index of each quantity
     * @param units   unit of each quantity
     * @param name    index of the name, or -1
     * @param count   number of columns
     * @param ignored other columns
     */
    private record Header(Map<String, Integer> columns, Map<String, LengthUnit> units, int name, int count, List<String> ignored) {

        static Header of(CsvRecords.Row row, String source) {
            requireCommas(row, source);
            Map<String, Integer> columns = new LinkedHashMap<>();
            Map<String, LengthUnit> units = new LinkedHashMap<>();
            List<String> ignored = new ArrayList<>();
            int name = -1;
            for (int i = 0; i < row.fields().size(); i++) {
                String title = row.fields().get(i).strip().toLowerCase(Locale.ROOT);
                Optional<String> quantity = QUANTITIES.stream().filter(q -> title.equals(q) || title.startsWith(q + "_")).findFirst();
                if (quantity.isPresent()) {
                    refuseSecond(columns.put(quantity.get(), i), quantity.get(), row, source);
                    units.put(quantity.get(), unit(quantity.get(), title, row, source));
                } else if (title.equals("name") || title.equals("point")) {
                    name = i;
                } else {
                    ignored.add(row.fields().get(i).strip());
                }
            }
            requireAll(columns, row, source);
            return new Header(columns, units, name, row.fields().size(), ignored);
        }

        private static void requireCommas(CsvRecords.Row row, String source) {
            if (row.fields().size() == 1 && row.fields().get(0).matches("(?s).*[;\t].*")) {
                throw bad(source, row, "is not separated by commas; separate columns by commas, and write numbers with a decimal dot");
            }
        }

        private static void refuseSecond(Integer first, String quantity, CsvRecords.Row row, String source) {
            if (first != null) {
                throw bad(source, row, "has two columns for the " + quantity + "; keep one");
            }
        }

        private static LengthUnit unit(String quantity, String title, CsvRecords.Row row, String source) {
            if (title.equals(quantity)) {
                throw bad(source, row, "has the column '" + title + "' without a unit; name it " + quantity + "_m or " + quantity + "_ft");
            }
            String code = title.substring(quantity.length() + 1);
            return LengthUnit.ofCode(code).orElseThrow(() -> bad(source, row, "has the column '" + title + "' with the unknown unit '" + code
                + "'; name it " + quantity + "_m or " + quantity + "_ft"));
        }

        private static void requireAll(Map<String, Integer> columns, CsvRecords.Row row, String source) {
            for (String quantity : QUANTITIES) {
                if (!columns.containsKey(quantity)) {
                    throw bad(source, row, "has no column " + quantity + "_m (or " + quantity + "_ft)");
                }
            }
        }

        private static CommandException bad(String source, CsvRecords.Row row, String problem) {
            return CommandException.file(source + ", line " + row.line() + ": the header " + problem);
        }
    }

    /** Collects points and problems row by row. */
    private static final class Reading {

        private final Header header;
        private final String source;
        private final List<FieldPoint> points = new ArrayList<>();
        private final List<String> names = new ArrayList<>();
        private final List<Integer> lines = new ArrayList<>();
        private final List<String> problems = new ArrayList<>();

        Reading(Header header, String source) {
            this.header = header;
            this.source = source;
        }

        void add(CsvRecords.Row row) {
            if (row.fields().size() != header.count()) {
                problems.add(at(row) + "has " + row.fields().size() + " fields where the header has " + header.count());
                return;
            }
            int before = problems.size();
            double station = number(row, "station");
            double offset = number(row, "offset");
            double height = number(row, "height");
            if (problems.size() == before) {
                points.add(new FieldPoint(station, offset, height));
                names.add(header.name() < 0 ? "" : row.fields().get(header.name()).strip());
                lines.add(row.line());
            }
        }

        private String at(CsvRecords.Row row) {
            return source + ", line " + row.line() + ": ";
        }

        private double number(CsvRecords.Row row, String quantity) {
            String text = row.fields().get(header.columns().get(quantity)).strip();
            if (!NUMBER.matcher(text).matches() || !Double.isFinite(Double.parseDouble(text))) {
                problems.add(at(row) + "the " + quantity + (text.isEmpty() ? " is missing" : " '" + text + "' is not a number"));
                return Double.NaN;
            }
            return header.units().get(quantity).toMetres(Double.parseDouble(text));
        }

        PointsFile finish() {
            if (!problems.isEmpty()) {
                throw new CommandException(ExitCode.FILE, shortened(problems));
            }
            if (points.isEmpty()) {
                throw CommandException.file(source + " has a header but no points; add a row for each point");
            }
            return new PointsFile(points, names, lines, header.ignored());
        }
    }

    /** The first problems, and how many more there are. */
    static List<String> shortened(List<String> problems) {
        if (problems.size() <= GREATEST_LISTED) {
            return problems;
        }
        List<String> lines = new ArrayList<>(problems.subList(0, GREATEST_LISTED));
        lines.add("and " + (problems.size() - GREATEST_LISTED) + " more bad rows");
        return lines;
    }
}
