/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package org.eclipse.jface.util;

/**
 * Assertions under the name by which GEF 3.2 calls them. JFace dropped this class long ago; the graphical editor framework on
 * Maven Central still links to it, so this fragment supplies it to that one host bundle and to nobody else.
 */
public final class Assert {

    private Assert() {
    }

    /** Throws {@link IllegalArgumentException} when {@code object} is null. */
    public static void isNotNull(Object object) {
        isNotNull(object, "");
    }

    /** Throws {@link IllegalArgumentException} with {@code message} when {@code object} is null. */
    public static void isNotNull(Object object, String message) {
        if (object == null) {
            throw new IllegalArgumentException("null argument: " + message);
        }
    }

    /** Throws {@link IllegalStateException} unless {@code expression} holds; returns true. */
    public static boolean isTrue(boolean expression) {
        return isTrue(expression, "");
    }

    /** Throws {@link IllegalStateException} with {@code message} unless {@code expression} holds; returns true. */
    public static boolean isTrue(boolean expression, String message) {
        if (!expression) {
            throw new IllegalStateException("assertion failed: " + message);
        }
        return true;
    }
}
