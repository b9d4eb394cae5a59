package org.wardon.web.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * Which part of a long list is shown, with links to its other parts.
 *
 * @param from first shown, counted from 1; 1 of an empty list
 * @param to last shown
 * @param all how many there are
 * @param parts links to parts: the first, the last and those near the one shown
 */
public record Paging(int from, int to, int all, List<Part> parts) {
    private static final Pattern NUMBER = Pattern.compile("[1-9][0-9]{0,6}");

    /** So many parts before and behind the one shown have links. */
    private static final int NEAR = 3;

    /** Copies the list. */
    public Paging {
        parts = List.copyOf(parts);
    }

    /**
     * A link to a part.
     *
     * @param href where it is
     * @param text its first and last, such as "31 to 60"
     * @param here whether it is the one shown
     */
    public record Part(String href, String text, boolean here) {}

    /**
     * Finds the part asked for.
     *
     * @param asked number of one that is to be in it, as it came in the address; the first part
     *     where it is none, the last where it lies beyond
     * @param all how many there are
     * @param most how many a part holds at most
     * @param words words of the pages
     * @param href address of the page, with what is asked beside the part
     * @return the part
     */
    public static Paging of(String asked, int all, int most, PageWords words, String href) {
        int wanted = NUMBER.matcher(asked).matches() ? Integer.parseInt(asked) : 1;
        int last = Math.max(0, all - 1) / most;
        int here = Math.min((wanted - 1) / most, last);
        List<Part> parts = new ArrayList<>();
        for (int part = 0; part <= last; part++) {
            if (part == 0 || part == last || Math.abs(part - here) <= NEAR) {
                String text = span(words, part * most + 1, Math.min(all, (part + 1) * most));
                parts.add(new Part(at(href, part * most + 1), text, part == here));
            }
        }
        return new Paging(here * most + 1, Math.min(all, (here + 1) * most), all, parts);
    }

    private static String span(PageWords words, int from, int to) {
        return words.say("parts.span", String.valueOf(from), String.valueOf(to));
    }

    private static String at(String href, int from) {
        return from == 1 ? href : href + (href.contains("?") ? "&" : "?") + "from=" + from;
    }

    /**
     * Returns the items shown.
     *
     * @param <T> what the list holds
     * @param list all of them
     * @return those of the part
     */
    public <T> List<T> of(List<T> list) {
        return list.subList(from - 1, to);
    }

    /**
     * Returns whether there is more than what is shown.
     *
     * @return true if so
     */
    public boolean isPart() {
        return to - from + 1 < all;
    }

    /**
     * Returns how many are not shown.
     *
     * @return their number
     */
    public int others() {
        return all - Math.max(0, to - from + 1);
    }
}
