package fluewright.fuels;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelSource;
import java.io.IOException;
import java.io.InputStream;
import java.net.JarURLConnection;
import java.net.URI;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.jar.JarFile;
import java.util.stream.Stream;

/**
 * The fuels that come with the program: the fuel files in the folder {@code builtin} beside this class. A fuel is found
 * by its name alone; the folder is listed only when the ids are asked for.
 */
public final class BuiltInFuels implements FuelSource {

    private static final String FOLDER = "builtin/";

    private final Map<String, Fuel> loaded = new ConcurrentHashMap<>();
    private Set<String> ids = Set.of();

    /** Makes the source; nothing is read yet. */
    public BuiltInFuels() {
    }

    @Override
    public String place() {
        return "built-in fuels";
    }

    @Override
    public int rank() {
        return 0;
    }

    @Override
    public synchronized Set<String> ids() {
        if (ids.isEmpty()) {
            ids = Collections.unmodifiableSet(listed());
        }
        return ids;
    }

    @Override
    public boolean has(String id) {
        return FuelId.isValid(id) && BuiltInFuels.class.getResource(resource(id)) != null;
    }

    /**
     * {@inheritDoc}
     *
     * @throws fluewright.engine.message.InputException when the source has it but cannot read it
     */
    @Override
    public Optional<Fuel> load(String id) {
        return has(id) ? Optional.of(loaded.computeIfAbsent(id, this::read)) : Optional.empty();
    }

    private Fuel read(String id) {
        try (InputStream stream = BuiltInFuels.class.getResourceAsStream(resource(id))) {
            return FuelFile.parse(stream.readAllBytes(), "built-in fuel " + id + FuelId.SUFFIX, id);
        } catch (IOException e) {
            throw FuelFile.unreadable(place(), id, e);
        }
    }

    private static String resource(String id) {
        return FOLDER + id + FuelId.SUFFIX;
    }

    /** Starts from the class file, because a jar need not have entries for its folders. */
    private Set<String> listed() {
        URL self = BuiltInFuels.class.getResource("BuiltInFuels.class");
        try {
            return self.getProtocol().equals("jar") ? inJar((JarURLConnection) self.openConnection()) : inFolder(self);
        } catch (IOException e) {
            throw FuelFile.unreadable(place(), "no access: " + e.getClass().getSimpleName(), e);
        }
    }

    private static Set<String> inJar(JarURLConnection self) throws IOException {
        String entry = self.getEntryName();
        String folder = entry.substring(0, entry.lastIndexOf('/') + 1) + FOLDER;
        self.setUseCaches(false);
        try (JarFile jar = self.getJarFile()) {
            return FuelId.ofNames(jar.stream().map(e -> e.getName()).filter(name -> name.startsWith(folder))
                    .map(name -> name.substring(folder.length())));
        }
    }

    private static Set<String> inFolder(URL self) throws IOException {
        try (Stream<Path> files = Files.list(Path.of(URI.create(self.toString())).resolveSibling(FOLDER))) {
            return FuelId.ofNames(files.map(file -> file.getFileName().toString()));
        }
    }
}
