package org.wardon.web;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What stands beside the records of a source file: a line a record and a line a component. */
final class RecordDocs {
    private static final Pattern TYPE =
            Pattern.compile(
                    "/\\*\\*((?:(?!\\*/).)*)\\*/\\s*(?:@\\w+(?:\\([^)]*\\))?\\s*)*"
                            + "((?:public\\s+|static\\s+|final\\s+|sealed\\s+)*)"
                            + "(record|class|interface|enum)\\s+(\\w+)",
                    Pattern.DOTALL);
    private static final Pattern PARAM = Pattern.compile("(?m)^@param (\\w+) ");

    private RecordDocs() {}

    static Map<String, String> of(Path file) throws IOException {
        String source = Files.readString(file);
        Map<String, String> docs = new TreeMap<>();
        List<String> around = new ArrayList<>();
        Matcher type = TYPE.matcher(source);
        while (type.find()) {
            int depth = indent(source, type.start()) / 4;
            while (around.size() > depth) {
                around.remove(around.size() - 1);
            }
            around.add(type.group(4));
            if (type.group(3).equals("record")) {
                told(String.join(".", around), type.group(1), docs);
            }
        }
        return docs;
    }

    private static int indent(String source, int at) {
        return at - source.lastIndexOf('\n', at) - 1;
    }

    private static void told(String name, String doc, Map<String, String> docs) {
        String plain = doc.replaceAll("(?m)^\\s*\\* ?", "");
        Matcher param = PARAM.matcher(plain);
        String key = name;
        int from = 0;
        while (param.find()) {
            docs.put(key, clean(plain.substring(from, param.start())));
            key = name + "." + param.group(1);
            from = param.end();
        }
        docs.put(key, clean(plain.substring(from)));
    }

    private static String clean(String text) {
        return text.replaceAll("(?ms)^@.*", "")
                .replaceAll("\\{@(?:code|link|literal)\\s+([^}]*)}", "$1")
                .replaceAll("\\s+", " ")
                .strip();
    }
}
