/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every text is used, every used text exists, and callers give as many arguments as the text has placeholders. */
class MessagesTest {

    private static final Path SOURCES = Path.of("..", "spanfield.study", "src");

    /** Calls that name a key: the texts themselves, and method notes, which use three keys each. */
    private static final Pattern CALL = Pattern.compile("(Messages\\.text|\\bnote)\\(");

    private static Properties texts() throws IOException {
        Properties texts = new Properties();
        try (Reader in = Files.newBufferedReader(SOURCES.resolve("spanfield/study/internal/messages.properties"))) {
            texts.load(in);
        }
        return texts;
    }

    /** Keys that the sources name, with the number of arguments given; -1 where the sources give it as a variable. */
    private static Map<String, Set<Integer>> calls() throws IOException {
        Map<String, Set<Integer>> calls = new HashMap<>();
        List<Path> files;
        try (Stream<Path> all = Files.walk(SOURCES)) {
            files = all.filter(p -> p.toString().endsWith(".java")).toList();
        }
        for (Path file : files) {
            String source = Files.readString(file);
            Matcher call = CALL.matcher(source);
            while (call.find()) {
                collect(arguments(source, call.end()), call.group(1).equals("note"), calls);
            }
        }
        return calls;
    }

    private static void collect(List<String> arguments, boolean note, Map<String, Set<Integer>> calls) {
        Matcher key = Pattern.compile("\"([^\"]+)\"").matcher(arguments.get(0));
        while (key.find()) {
            if (key.group(1).startsWith(".")) {
                continue;
            }
            calls.computeIfAbsent(key.group(1), k -> new HashSet<>()).add(arguments.size() - 1);
            if (note) {
                calls.computeIfAbsent(key.group(1) + ".topic", k -> new HashSet<>()).add(0);
                calls.computeIfAbsent(key.group(1) + ".source", k -> new HashSet<>()).add(0);
            }
        }
    }

    /** Arguments of a call, split at the commas of its own level. */
    private static List<String> arguments(String source, int from) {
        List<String> result = new java.util.ArrayList<>();
        int depth = 0;
        boolean quoted = false;
        int start = from;
        for (int i = from; ; i++) {
            char c = source.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (!quoted && c == '(') {
                depth++;
            } else if (!quoted && (c == ')' && depth-- == 0 || c == ',' && depth == 0)) {
                result.add(source.substring(start, i));
                start = i + 1;
                if (c == ')') {
                    return result;
                }
            }
        }
    }

    @Test
    void everyText_isUsedAndEveryUsedTextExists() throws IOException {
        assertEquals(new TreeSet<>(texts().stringPropertyNames()), new TreeSet<>(calls().keySet()));
    }

    @Test
    void everyCall_givesAsManyArgumentsAsTheTextHasPlaceholders() throws IOException {
        Properties texts = texts();
        for (Map.Entry<String, Set<Integer>> call : calls().entrySet()) {
            int placeholders = new MessageFormat(texts.getProperty(call.getKey())).getFormatsByArgumentIndex().length;
            assertEquals(Set.of(placeholders), call.getValue(), call.getKey());
        }
    }

    @Test
    void everyText_isWholeAndQuotedForTheFormatter() throws IOException {
        for (Map.Entry<Object, Object> text : texts().entrySet()) {
            String shown = new MessageFormat(text.getValue().toString()).format(new Object[] {"a", "b", "c", "d", "e"});
            assertTrue(!shown.contains("{") && !shown.contains("}"), text.getKey() + " shows a placeholder: " + shown);
            assertTrue(!text.getValue().toString().replace("''", "").contains("'"), text.getKey() + " has a single quote");
        }
    }
}
