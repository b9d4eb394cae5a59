package org.wardon.cli;

/** Text for a person, no wider than a page, hanging under its first word. */
final class Paragraph {
    /** Widest line, characters. */
    static final int WIDTH = 100;

    private Paragraph() {}

    /**
     * Returns a text broken into lines that end with a line feed.
     *
     * @param lead what stands before the text on the first line; later lines are indented as far
     * @param text the text, words parted by spaces
     */
    static String hanging(String lead, String text) {
        String indent = " ".repeat(lead.length());
        StringBuilder page = new StringBuilder();
        StringBuilder line = new StringBuilder(lead);
        boolean bare = true;
        for (String word : text.strip().split(" ", -1)) {
            if (!bare && line.length() + 1 + word.length() > WIDTH) {
                page.append(line.toString().stripTrailing()).append('\n');
                line.setLength(0);
                line.append(indent);
                bare = true;
            }
            line.append(bare ? "" : " ").append(word);
            bare = false;
        }
        return page.append(line.toString().stripTrailing()).append('\n').toString();
    }

    /** Returns an entry of a list, its source in brackets. */
    static String entry(String indent, String text, String source) {
        return hanging(indent + "- ", text + " [" + source + "]");
    }
}
