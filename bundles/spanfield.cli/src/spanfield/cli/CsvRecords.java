/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.ArrayList;
import java.util.List;

/** Records of comma-separated values (RFC 4180), with lines ended by CR LF, LF or CR. Blank lines are no records. */
final class CsvRecords {

    /**
     * A record.
     *
     * @param line   line on which it starts, from 1
     * @param fields its fields, unquoted
     */
    record Row(int line, List<String> fields) {

        Row {
            fields = List.copyOf(fields);
        }
    }

    private final String text;
    private final String source;
    private int at;
    private int line = 1;

    /**
     * @param text   all the text, without byte order mark
     * @param source name of the source for messages
     */
    CsvRecords(String text, String source) {
        this.text = text;
        this.source = source;
    }

    /**
     * The records in order.
     *
     * @throws CommandException when a quote is not closed or is followed by more text
     */
    List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        while (at < text.length()) {
            Row row = row();
            boolean blank = row.fields().size() == 1 && row.fields().get(0).isBlank();
            if (!blank) {
                rows.add(row);
            }
        }
        return rows;
    }

    private Row row() {
        int start = line;
        List<String> fields = new ArrayList<>();
        fields.add(field());
        while (at < text.length() && text.charAt(at) == ',') {
            at++;
            fields.add(field());
        }
        endLine();
        return new Row(start, fields);
    }

    private void endLine() {
        if (at < text.length()) {
            at += text.startsWith("\r\n", at) ? 2 : 1;
            line++;
        }
    }

    private String field() {
        int first = at;
        while (first < text.length() && text.charAt(first) == ' ') {
            first++;
        }
        if (first < text.length() && text.charAt(first) == '"') {
            at = first + 1;
            return quoted();
        }
        int start = at;
        while (at < text.length() && !endsField(text.charAt(at))) {
            at++;
        }
        return text.substring(start, at);
    }

    private static boolean endsField(char c) {
        return c == ',' || c == '\n' || c == '\r';
    }

    private String quoted() {
        int start = line;
        StringBuilder field = new StringBuilder();
        while (at < text.length()) {
            char c = text.charAt(at++);
            if (c == '"') {
                if (at < text.length() && text.charAt(at) == '"') {
                    at++;
                } else {
                    return closed(field);
                }
            }
            // A carriage return before a line feed is the same line end.
            line += c == '\n' || c == '\r' && !(at < text.length() && text.charAt(at) == '\n') ? 1 : 0;
            field.append(c);
        }
        throw CommandException.file(source + ", line " + start + ": a quote is opened and not closed");
    }

    private String closed(StringBuilder field) {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
        if (at < text.length() && !endsField(text.charAt(at))) {
            throw CommandException.file(source + ", line " + line + ": text follows a closing quote; double the quotes within a field");
        }
        return field.toString();
    }
}
