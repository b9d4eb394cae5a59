package org.wardon.web.chamber;

/** Texts of pictures. */
final class SafeText {
    private SafeText() {}

    static String of(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
