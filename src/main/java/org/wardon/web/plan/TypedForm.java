package org.wardon.web.plan;

import io.javalin.http.Context;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wardon.files.form.PlanChange;

/**
 * What was typed into a form of a plan. Names of fields begin with what they are: {@code v:} a
 * value, {@code o:} the option of a choice, {@code s:} words ticked; the JSON path follows. A value
 * of one option among several of a path has {@code |OPTION} behind it and counts where that option
 * was taken.
 */
final class TypedForm {
    private TypedForm() {}

    static PlanChange.Typed of(Context http) {
        Map<String, String> values = new HashMap<>();
        Map<String, String> options = new HashMap<>();
        Map<String, List<String>> sets = new HashMap<>();
        Map<String, List<String>> sent = http.formParamMap();
        sent.forEach(
                (name, typed) -> {
                    if (name.startsWith("o:")) {
                        options.put(name.substring(2), typed.get(0));
                    } else if (name.startsWith("s:")) {
                        sets.put(
                                name.substring(2),
                                typed.stream().filter(word -> !word.isEmpty()).toList());
                    }
                });
        sent.forEach(
                (name, typed) -> {
                    if (name.startsWith("v:")) {
                        String[] parts = name.substring(2).split("\\|", 2);
                        boolean counts =
                                parts.length == 1
                                        || parts[1].equals(options.getOrDefault(parts[0], ""));
                        if (counts) {
                            values.put(parts[0], typed.get(0));
                        }
                    }
                });
        return new PlanChange.Typed(values, options, sets);
    }
}
