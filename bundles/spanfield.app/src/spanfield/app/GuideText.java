/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The guide as topics: a line that begins with "# " starts a topic, one with "- " is a point of a list, the rest are paragraphs. */
public final class GuideText {

    /** A topic: title and body lines; list points keep their "- ". */
    public record Topic(String title, List<String> lines) {

        public Topic {
            lines = List.copyOf(lines);
        }

        /** The body in the mark-up of the platform's form text. */
        public String markup() {
            StringBuilder text = new StringBuilder("<form>");
            for (String line : lines) {
                String escaped = line.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
                text.append(line.startsWith("- ") ? "<li>" + escaped.substring(2) + "</li>" : "<p>" + escaped + "</p>");
            }
            return text.append("</form>").toString();
        }
    }

    private GuideText() {
    }

    /** The topics of one part of the guide: "pages" or "quantities". */
    public static List<Topic> read(String part) {
        try (InputStream in = GuideText.class.getResourceAsStream("/guide/" + part + ".txt")) {
            return parse(new String(in.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException broken) {
            throw new IllegalStateException("the guide cannot be read", broken);
        }
    }

    static List<Topic> parse(String text) {
        List<Topic> topics = new ArrayList<>();
        String title = null;
        List<String> lines = new ArrayList<>();
        for (String line : text.lines().toList()) {
            if (line.startsWith("# ")) {
                if (title != null) {
                    topics.add(new Topic(title, lines));
                }
                title = line.substring(2);
                lines.clear();
            } else if (!line.isBlank()) {
                lines.add(line);
            }
        }
        if (title != null) {
            topics.add(new Topic(title, lines));
        }
        return topics;
    }
}
