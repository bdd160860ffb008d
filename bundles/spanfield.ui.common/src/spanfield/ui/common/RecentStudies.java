/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.eclipse.core.runtime.preferences.IEclipsePreferences;
import org.eclipse.core.runtime.preferences.InstanceScope;
import org.osgi.service.prefs.BackingStoreException;

/** The studies that were opened or saved last, newest first, kept between sessions. */
public final class RecentStudies {

    private static final int MOST = 9;
    private static final String KEY = "recentStudies";
    private static final String SEPARATOR = "\n";

    private RecentStudies() {
    }

    /** Files that still exist, newest first. */
    public static List<Path> list() {
        String stored = preferences().get(KEY, "");
        return Arrays.stream(stored.split(SEPARATOR)).filter(text -> !text.isEmpty()).map(Path::of).filter(Files::isRegularFile).toList();
    }

    /** Puts a file at the head of the list. */
    public static void add(Path path) {
        List<String> paths = new ArrayList<>();
        paths.add(path.toAbsolutePath().normalize().toString());
        for (Path old : list()) {
            if (!paths.contains(old.toString()) && paths.size() < MOST) {
                paths.add(old.toString());
            }
        }
        IEclipsePreferences preferences = preferences();
        preferences.put(KEY, String.join(SEPARATOR, paths));
        try {
            preferences.flush();
        } catch (BackingStoreException lost) {
            // the list is a convenience; the next session goes without
        }
    }

    private static IEclipsePreferences preferences() {
        return InstanceScope.INSTANCE.getNode("spanfield.ui.common");
    }
}
