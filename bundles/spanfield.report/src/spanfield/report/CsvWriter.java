/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;

/**
 * Comma-separated values after RFC 4180: records end with CR LF, fields with a comma, a quote or a line break are quoted, quotes are
 * doubled. Numbers are written with a decimal dot and every digit that is needed to read the same double again; numbers that do not exist
 * are empty fields.
 */
public final class CsvWriter {

    private final Appendable out;
    private final int columns;

    /**
     * Starts a table with its header record.
     *
     * @param out    where to write
     * @param header names of the columns, the unit in each name where there is one
     */
    public CsvWriter(Appendable out, List<String> header) {
        this.out = out;
        this.columns = header.size();
        write(header);
    }

    /**
     * Writes a record.
     *
     * @param fields strings, numbers (NaN and null become empty), or anything else by its text
     * @throws IllegalArgumentException when the number of fields is not that of the header
     */
    public void record(List<?> fields) {
        if (fields.size() != columns) {
            throw new IllegalArgumentException("a record of " + fields.size() + " fields under a header of " + columns);
        }
        write(fields);
    }

    private void write(List<?> fields) {
        try {
            for (int i = 0; i < fields.size(); i++) {
                out.append(i > 0 ? "," : "").append(quoted(text(fields.get(i))));
            }
            out.append("\r\n");
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    private static String text(Object field) {
        if (field == null) {
            return "";
        }
        return field instanceof Double number ? number(number) : field.toString();
    }

    /** A double so that it reads back the same; NaN as an empty field. */
    static String number(double value) {
        if (Double.isNaN(value)) {
            return "";
        }
        return value == 0 ? "0.0" : Double.toString(value);
    }

    private static String quoted(String text) {
        boolean plain = text.chars().noneMatch(c -> c == ',' || c == '"' || c == '\r' || c == '\n');
        return plain ? text : '"' + text.replace("\"", "\"\"") + '"';
    }
}
