package org.wardon.logbook;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.errors.BadInput;

/** Rows of kept plans. Files that stay the same from version to version are kept once. */
final class PlanRows {
    private static final String PLAN =
            "select plan.id, version.name, plan.current, plan.changed_at, version.note,"
                    + " version.parent, exists (select 1 from kept_version child where"
                    + " child.plan_id = plan.id and child.parent = plan.current) as redo"
                    + " from kept_plan plan join kept_version version on version.plan_id = plan.id"
                    + " and version.number = plan.current";

    private PlanRows() {}

    static List<KeptPlan> list(Connection open) throws SQLException {
        return plans(open, PLAN + " order by plan.changed_at desc, plan.id desc");
    }

    static Optional<KeptPlan> find(Connection open, long id) throws SQLException {
        return plans(open, PLAN + " where plan.id = ?", id).stream().findFirst();
    }

    static Optional<KeptPlan> from(Connection open, String origin) throws SQLException {
        return plans(open, PLAN + " where plan.origin = ? order by plan.id desc", origin).stream()
                .findFirst();
    }

    private static List<KeptPlan> plans(Connection open, String sql, Object... with)
            throws SQLException {
        List<KeptPlan> plans = new ArrayList<>();
        try (PreparedStatement select = filled(open, sql, with);
                ResultSet row = select.executeQuery()) {
            while (row.next()) {
                plans.add(
                        new KeptPlan(
                                row.getLong("id"),
                                row.getString("name"),
                                row.getInt("current"),
                                instant(row.getString("changed_at")),
                                row.getString("note"),
                                row.getInt("parent") > 0,
                                row.getInt("redo") > 0));
            }
        }
        return plans;
    }

    static Optional<PlanText> text(Connection open, long id, int version) throws SQLException {
        try (PreparedStatement select =
                        filled(
                                open,
                                "select text from kept_version where plan_id = ? and number = ?",
                                id,
                                version);
                ResultSet row = select.executeQuery()) {
            return row.next()
                    ? Optional.of(new PlanText(row.getString(1), files(open, id, version)))
                    : Optional.empty();
        }
    }

    private static Map<String, String> files(Connection open, long id, int version)
            throws SQLException {
        Map<String, String> files = new HashMap<>();
        try (PreparedStatement select =
                        filled(
                                open,
                                "select name, body.text from kept_file join kept_body body using"
                                        + " (digest) where plan_id = ? and version = ?",
                                id,
                                version);
                ResultSet row = select.executeQuery()) {
            while (row.next()) {
                files.put(row.getString(1), row.getString(2));
            }
        }
        return files;
    }

    static List<PlanVersion> history(Connection open, long id) throws SQLException {
        List<PlanVersion> versions = new ArrayList<>();
        try (PreparedStatement select =
                        filled(
                                open,
                                "select number, parent, note, at from kept_version where plan_id ="
                                        + " ? order by number desc",
                                id);
                ResultSet row = select.executeQuery()) {
            while (row.next()) {
                versions.add(
                        new PlanVersion(
                                row.getInt(1),
                                row.getInt(2),
                                row.getString(3),
                                instant(row.getString(4))));
            }
        }
        return versions;
    }

    private static Instant instant(String text) {
        try {
            return Instant.parse(text);
        } catch (DateTimeException e) {
            throw new BadInput(
                    "store.db",
                    "",
                    "the time '" + text + "' of a kept plan cannot be read",
                    "accepted: as the program wrote it; restore it from a copy");
        }
    }

    static long insert(Connection open, String origin, String at) throws SQLException {
        return number(
                open,
                "insert into kept_plan (origin, current, changed_at) values (?, 1, ?) returning id",
                origin,
                at);
    }

    static void insert(Connection open, long id, KeptPlans.Row row) throws SQLException {
        run(
                open,
                "insert into kept_version (plan_id, number, parent, name, text, note, at) values"
                        + " (?, ?, ?, ?, ?, ?, ?)",
                id,
                row.number(),
                row.parent(),
                row.name(),
                row.text().text(),
                row.note(),
                row.at());
        for (Map.Entry<String, String> file : row.text().files().entrySet()) {
            String digest = digest(file.getValue());
            run(
                    open,
                    "insert or ignore into kept_body (digest, text) values (?, ?)",
                    digest,
                    file.getValue());
            run(
                    open,
                    "insert into kept_file (plan_id, version, name, digest) values (?, ?, ?, ?)",
                    id,
                    row.number(),
                    file.getKey(),
                    digest);
        }
    }

    static int latest(Connection open, long id) throws SQLException {
        return (int)
                number(
                        open,
                        "select coalesce(max(number), 0) from kept_version where plan_id = ?",
                        id);
    }

    static int parent(Connection open, long id, int version) throws SQLException {
        return (int)
                number(
                        open,
                        "select coalesce(max(parent), 0) from kept_version where plan_id = ? and"
                                + " number = ?",
                        id,
                        version);
    }

    /** The latest made from a version: the one gone back from, if any was. */
    static int child(Connection open, long id, int version) throws SQLException {
        return (int)
                number(
                        open,
                        "select coalesce(max(number), 0) from kept_version where plan_id = ? and"
                                + " parent = ?",
                        id,
                        version);
    }

    static void pointTo(Connection open, long id, int version, String at) throws SQLException {
        run(open, "update kept_plan set current = ?, changed_at = ? where id = ?", version, at, id);
    }

    static void delete(Connection open, long id) throws SQLException {
        run(open, "delete from kept_file where plan_id = ?", id);
        run(open, "delete from kept_version where plan_id = ?", id);
        run(open, "delete from kept_plan where id = ?", id);
        run(open, "delete from kept_body where digest not in (select digest from kept_file)");
    }

    private static void run(Connection open, String sql, Object... with) throws SQLException {
        try (PreparedStatement statement = filled(open, sql, with)) {
            statement.executeUpdate();
        }
    }

    private static long number(Connection open, String sql, Object... with) throws SQLException {
        try (PreparedStatement statement = filled(open, sql, with);
                ResultSet row = statement.executeQuery()) {
            return row.next() ? row.getLong(1) : 0;
        }
    }

    private static PreparedStatement filled(Connection open, String sql, Object... with)
            throws SQLException {
        PreparedStatement statement = open.prepareStatement(sql);
        for (int i = 0; i < with.length; i++) {
            statement.setObject(i + 1, with[i]);
        }
        return statement;
    }

    private static String digest(String text) {
        try {
            MessageDigest sha = MessageDigest.getInstance("SHA-256");
            return HexFormat.of().formatHex(sha.digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
