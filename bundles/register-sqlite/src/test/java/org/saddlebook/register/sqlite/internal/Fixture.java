package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Verification;
import org.saddlebook.register.internal.RegistersService;
import org.sqlite.JDBC;

/** What the tests of this bundle do again and again. */
final class Fixture {
    private Fixture() {}

    static Register open(Path file, Opening opening) throws RegisterException {
        SqliteStoreFactory factory = new SqliteStoreFactory(Optional.empty());
        return new RegistersService(List.of(factory)).open(file.toString(), opening, Clock.systemUTC());
    }

    static Receipt enter(Register register, String content) throws IOException {
        return register.enter(
                Draft.entered("ada", "entry"),
                List.of(
                        PartFile.of("campaign.json", "application/json", "{}".getBytes(StandardCharsets.UTF_8)),
                        PartFile.of("findings.json", "application/json", content.getBytes(StandardCharsets.UTF_8))));
    }

    static Verification verify(Path file, Checkpoint... kept) throws RegisterException, Cancelled {
        try (Register register = open(file, Opening.EXISTING)) {
            return register.verify(List.of(kept), Progress.NONE);
        }
    }

    static List<String> codes(Verification verification) {
        List<String> codes = new ArrayList<>();
        for (Verification.Difference difference : verification.differences()) {
            codes.add(difference.code() + "@"
                    + (difference.number().isPresent()
                            ? Long.toString(difference.number().getAsLong())
                            : "-"));
        }
        return codes;
    }

    /** Runs statements on the file behind the register's back. */
    static void sql(Path file, String... statements) throws SQLException {
        try (Connection connection = new JDBC().connect("jdbc:sqlite:" + file, new Properties());
                Statement statement = connection.createStatement()) {
            for (String sql : statements) {
                statement.execute(sql);
            }
        }
    }
}
