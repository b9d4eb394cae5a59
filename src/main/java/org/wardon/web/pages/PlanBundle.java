package org.wardon.web.pages;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.wardon.logbook.PlanText;
import org.wardon.web.work.OpenPlan;

/**
 * A plan to be taken away: JSON alone, or a ZIP where files belong to it.
 *
 * @param fileName name of the file
 * @param mediaType its media type
 * @param content its content
 */
@SuppressWarnings("ArrayRecordComponent")
public record PlanBundle(String fileName, String mediaType, byte[] content) {
    /**
     * Bundles a plan.
     *
     * @param open the plan
     * @return the file
     */
    public static PlanBundle of(OpenPlan open) {
        String name = "store-plan-" + open.kept().id();
        PlanText text = open.text();
        return text.files().isEmpty()
                ? new PlanBundle(
                        name + ".json",
                        "application/json",
                        text.text().getBytes(StandardCharsets.UTF_8))
                : new PlanBundle(name + ".zip", "application/zip", zip(name, text));
    }

    /**
     * Returns the header that names the file.
     *
     * @return value of {@code Content-Disposition}
     */
    public String disposition() {
        return "attachment; filename=\"" + fileName + "\"";
    }

    private static byte[] zip(String name, PlanText text) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes, StandardCharsets.UTF_8)) {
            entry(zip, name + ".json", text.text());
            for (Map.Entry<String, String> file : text.files().entrySet()) {
                entry(zip, file.getKey(), file.getValue());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }

    private static void entry(ZipOutputStream zip, String name, String text) throws IOException {
        zip.putNextEntry(new ZipEntry(name));
        zip.write(text.getBytes(StandardCharsets.UTF_8));
        zip.closeEntry();
    }
}
