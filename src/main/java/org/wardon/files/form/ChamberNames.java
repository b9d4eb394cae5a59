package org.wardon.files.form;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;

/** Lets everything that names a chamber follow when its id is changed. */
final class ChamberNames {
    private static final Pattern NAME = Pattern.compile("\\$\\.chambers\\[\\d+]\\.id");
    private static final Pattern NAMES_ONE =
            Pattern.compile(".*\\.chamber|\\$\\.lots\\[\\d+]\\.moves\\[\\d+]\\.to");

    private ChamberNames() {}

    static boolean isName(JsonPath path) {
        return NAME.matcher(path.toString()).matches();
    }

    /** Changes the id wherever it is named, unless another chamber still has it. */
    static JsonEdit follow(JsonEdit edit, String from, String to) {
        FormPlace root = PlanForm.of(edit.text()).root();
        boolean stillThere =
                root.place("chambers").stream()
                        .flatMap(list -> list.places().stream())
                        .flatMap(chamber -> chamber.place("id").stream())
                        .anyMatch(id -> id.written().equals(from));
        if (from.isEmpty() || stillThere) {
            return edit;
        }
        List<JsonPath> named = new ArrayList<>();
        collect(root.json().orElseThrow(), JsonPath.ROOT, from, named);
        JsonEdit followed = edit;
        for (JsonPath path : named) {
            followed = followed.set(path, JsonEdit.quoted(to));
        }
        return followed;
    }

    private static void collect(Json json, JsonPath path, String id, List<JsonPath> named) {
        if (json instanceof Json.Obj object) {
            object.members()
                    .forEach((n, v) -> collect(v, path.then(new JsonPath.Member(n)), id, named));
        } else if (json instanceof Json.Arr list) {
            for (int i = 0; i < list.items().size(); i++) {
                collect(list.items().get(i), path.then(new JsonPath.Item(i)), id, named);
            }
        } else if (json.equals(new Json.Text(id)) && NAMES_ONE.matcher(path.toString()).matches()) {
            named.add(path);
        }
    }
}
