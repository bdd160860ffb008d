/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/** Texts of the study for people, from messages.properties beside this class. */
public final class Messages {

    private static final ResourceBundle TEXTS = ResourceBundle.getBundle("spanfield.study.internal.messages", Locale.ROOT,
        Messages.class.getClassLoader());

    private Messages() {
    }

    /**
     * A text.
     *
     * @param key       key of the text
     * @param arguments values of its placeholders; numbers with a fraction are shown with four significant digits
     */
    public static String text(String key, Object... arguments) {
        Object[] texts = new Object[arguments.length];
        for (int i = 0; i < texts.length; i++) {
            texts[i] = arguments[i] instanceof Double number ? Texts.number(number) : String.valueOf(arguments[i]);
        }
        return new MessageFormat(TEXTS.getString(key), Locale.ROOT).format(texts);
    }
}
