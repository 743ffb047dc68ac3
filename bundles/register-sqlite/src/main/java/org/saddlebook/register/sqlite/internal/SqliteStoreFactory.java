package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.RegisterStoreFactory;

/** Keeps registers in SQLite files. */
@Component
public final class SqliteStoreFactory implements RegisterStoreFactory {
    private final Optional<Path> cache;
    private final Place place;

    /** With the launcher's cache folder for the native library, where it names one. */
    @Activate
    public SqliteStoreFactory(BundleContext context) {
        this(Optional.ofNullable(context.getProperty("saddlebook.cache")).map(Path::of), Place.ofThisMachine());
    }

    /** With this cache folder; without one the driver unpacks its native library at each start. */
    public SqliteStoreFactory(Optional<Path> cache) {
        this(cache, Place.ofThisMachine());
    }

    SqliteStoreFactory(Optional<Path> cache, Place place) {
        this.cache = cache;
        this.place = place;
    }

    @Override
    public String id() {
        return "sqlite";
    }

    @Override
    public boolean accepts(String location) {
        return !location.isBlank() && !location.contains("://");
    }

    @Override
    public RegisterStore open(String location, Opening opening) throws RegisterException {
        Path file;
        try {
            file = Path.of(location).toAbsolutePath();
        } catch (InvalidPathException e) {
            throw new RegisterException("\"" + location + "\" cannot be the name of a file: " + e.getReason() + ".", e);
        }
        place.check(file);
        try {
            if (opening == Opening.CREATE) {
                place.make(file);
            } else if (!Files.exists(file)) {
                throw new RegisterException(
                        "There is no register at " + file + ". \"enter\" makes one; --register names another.");
            }
        } catch (RegisterException e) {
            throw e;
        } catch (IOException e) {
            throw new RegisterException(
                    "The register " + file + " cannot be made: " + Failures.reason(e)
                            + ". Choose a folder you may write to with --register.",
                    e);
        }
        cache.ifPresent(NativeLibrary::prepare);
        return SqliteStore.open(file, opening);
    }
}
