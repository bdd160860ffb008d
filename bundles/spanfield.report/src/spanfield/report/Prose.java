/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

/** Running text in lines of a bounded width. */
final class Prose {

    /** Greatest width of a line of running text, in characters. */
    static final int WIDTH = 100;

    private Prose() {
    }

    /**
     * Wraps text at blanks.
     *
     * @param first  start of the first line, such as a bullet
     * @param indent start of the other lines
     * @param text   one paragraph
     * @return lines, each ended by a line feed
     */
    static String wrap(String first, String indent, String text) {
        StringBuilder out = new StringBuilder();
        StringBuilder line = new StringBuilder(first);
        boolean empty = true;
        for (String word : text.strip().split("\\s+")) {
            if (!empty && line.length() + 1 + word.length() > WIDTH) {
                out.append(line.toString().stripTrailing()).append('\n');
                line = new StringBuilder(indent);
                empty = true;
            }
            line.append(empty ? "" : " ").append(word);
            empty = false;
        }
        return out.append(line.toString().stripTrailing()).append('\n').toString();
    }
}
