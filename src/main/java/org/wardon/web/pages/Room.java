package org.wardon.web.pages;

import java.util.Locale;

/** The rooms of the navigation, in its order. A room without a plan has a path of its own. */
public enum Room {
    /** All chambers of a plan. */
    CHAMBERS("/plan/{plan}"),
    /** A lot that comes to the door. */
    DOOR("/plan/{plan}/door"),
    /** Which lot goes where. */
    PLACING("/plan/{plan}/placing"),
    /** The open plan, to be changed. */
    PLAN("/plan/{plan}/edit"),
    /** Crops and what is known of them. */
    CROPS("/crops"),
    /** All kept plans. */
    PLANS("/plans");

    private final String path;

    Room(String path) {
        this.path = path;
    }

    /**
     * Returns whether the room needs an open plan.
     *
     * @return true if so
     */
    public boolean ofPlan() {
        return path.contains("{plan}");
    }

    /**
     * Returns where it is.
     *
     * @param plan number of the open plan, where it needs one
     * @return its path
     */
    public String path(long plan) {
        return path.replace("{plan}", String.valueOf(plan));
    }

    /**
     * Returns the key of its name.
     *
     * @return a key of the words
     */
    public String key() {
        return "room." + name().toLowerCase(Locale.ROOT);
    }
}
