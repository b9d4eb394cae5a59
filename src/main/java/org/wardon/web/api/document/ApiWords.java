package org.wardon.web.api.document;

import java.util.Properties;
import java.util.Set;

/** Words of the document: of operations, names in paths, statuses; of every name in an answer. */
public final class ApiWords {
    private final Properties operations = Resource.words("operations.properties");
    private final Properties fields = Resource.words("fields.properties");

    /** Reads the words. */
    public ApiWords() {}

    /**
     * Says what an operation, a name in a path or a status is.
     *
     * @param key its key
     * @return its words
     * @throws IllegalArgumentException where there are none
     */
    public String told(String key) {
        return said(operations, key);
    }

    /**
     * Says what a name of an answer is.
     *
     * @param key names of the records around it and its own, points between
     * @return its words, as beside the record
     * @throws IllegalArgumentException where there are none
     */
    public String field(String key) {
        return said(fields, key);
    }

    private static String said(Properties words, String key) {
        String said = words.getProperty(key);
        if (said == null) {
            throw new IllegalArgumentException("no words for " + key);
        }
        return said;
    }

    /**
     * Returns all keys of operations.
     *
     * @return the keys
     */
    public Set<String> keys() {
        return operations.stringPropertyNames();
    }

    /**
     * Returns all keys of names.
     *
     * @return the keys
     */
    public Set<String> fieldKeys() {
        return fields.stringPropertyNames();
    }
}
