package org.wardon.web.pages;

import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;
import org.wardon.logbook.KeptPlan;

/**
 * What every page has around its own: title, open plan, room, token, words and figures. Templates
 * ask it for words.
 *
 * @param title title of the page
 * @param room where in the navigation it is; absent for pages beside it
 * @param plan the open plan
 * @param token token of the session, for forms; blank where there is none
 * @param preferences the person's preferences
 * @param words the words
 * @param assets addresses of style, script and charts
 * @param address path and question the page was asked by, for a page that asks to be loaded again
 * @param waiting whether it does, for people without script
 * @param leaves whether there is something to leave, a passcode having been asked
 */
public record Frame(
        String title,
        Optional<Room> room,
        Optional<KeptPlan> plan,
        String token,
        Preferences preferences,
        PageWords words,
        Assets assets,
        String address,
        boolean waiting,
        boolean leaves) {
    private static final DateTimeFormatter SAVED_AT =
            DateTimeFormatter.ofPattern("d MMM yyyy, HH:mm 'UTC'", Locale.UK)
                    .withZone(ZoneOffset.UTC);

    /**
     * Returns words.
     *
     * @param key a key of the words
     * @param with what fills them
     * @return the words
     */
    public String say(String key, String... with) {
        return words.say(key, with);
    }

    /**
     * Returns the figures.
     *
     * @return as the person prefers
     */
    public Figures figures() {
        return new Figures(preferences);
    }

    /**
     * Returns when the open plan was saved, for paper: there it stands by itself.
     *
     * @return such as "2 Dec 2026, 16:10 UTC", blank where no plan is open
     */
    public String savedAt() {
        return plan.map(kept -> SAVED_AT.format(kept.changedAt())).orElse("");
    }

    /**
     * Returns whether a room is the one shown.
     *
     * @param other a room
     * @return true if so
     */
    public boolean in(Room other) {
        return room.isPresent() && room.get() == other;
    }

    /**
     * Returns the same frame under another title.
     *
     * @param other the title
     * @return the frame
     */
    public Frame titled(String other) {
        return new Frame(
                other, room, plan, token, preferences, words, assets, address, waiting, leaves);
    }

    /**
     * Returns the same frame for a page that asks to be loaded again.
     *
     * @return the frame
     */
    public Frame thatWaits() {
        return new Frame(
                title, room, plan, token, preferences, words, assets, address, true, leaves);
    }
}
