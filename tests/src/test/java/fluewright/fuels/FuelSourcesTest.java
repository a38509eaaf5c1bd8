package fluewright.fuels;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelLibrary;
import fluewright.engine.fuel.FuelSource;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The places that fuels come from. */
class FuelSourcesTest {

    @TempDir
    Path folder;

    private void write(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private static String oil(String id) {
        return FuelFileTest.OIL.replace("my-oil", id);
    }

    @Test
    void servicesAreRankedBuiltInSiteUser() {
        List<Class<?>> types = ServiceLoader.load(FuelSource.class).stream().map(p -> (Class<?>) p.type()).collect(Collectors.toList());
        assertTrue(types.containsAll(List.of(BuiltInFuels.class, SiteFuels.class, UserFuels.class)));
        assertEquals(List.of(0, 10, 20), Stream.of(new BuiltInFuels(), new SiteFuels(), new UserFuels()).map(FuelSource::rank).toList());
    }

    @Test
    void aMissingFolderIsEmpty() {
        FolderFuels source = new FolderFuels(folder.resolve("absent"), 20);
        assertEquals(Set.of(), source.ids());
        assertFalse(source.has("methane"));
        assertEquals(Optional.empty(), source.load("methane"));
    }

    @Test
    void withoutItsVariableTheSiteHasNoFolder() {
        assertEquals(Optional.empty(), SiteFuels.folder(null));
        assertEquals(Optional.empty(), SiteFuels.folder(" "));
        assertEquals(Optional.of(Path.of("site/fuels")), SiteFuels.folder("site/fuels"));
        FolderFuels none = new FolderFuels(Optional.empty(), 10);
        assertEquals(Set.of(), none.ids());
        assertFalse(none.has("methane"));
        assertEquals("no folder", none.place());
    }

    @Test
    void aFolderListsItsFilesAndReadsThemAnew() throws IOException {
        write("b-oil.yaml", oil("b-oil"));
        write("a-oil.yaml", oil("a-oil"));
        write("notes.txt", "no fuel");
        Files.createDirectory(folder.resolve("dir.yaml"));
        FolderFuels source = new FolderFuels(folder, 20);
        assertEquals(List.of("a-oil", "b-oil"), List.copyOf(source.ids()));
        assertEquals("My oil", source.load("a-oil").orElseThrow().title());
        write("a-oil.yaml", oil("a-oil").replace("My oil", "Other oil"));
        assertEquals("Other oil", source.load("a-oil").orElseThrow().title());
        Files.delete(folder.resolve("a-oil.yaml"));
        assertFalse(source.has("a-oil"));
    }

    @Test
    void noIdLeadsOutOfAFolder() throws IOException {
        write("secret.yaml", oil("secret"));
        Path inner = Files.createDirectory(folder.resolve("inner"));
        FolderFuels source = new FolderFuels(inner, 20);
        BuiltInFuels builtIn = new BuiltInFuels();
        for (String id : List.of("../secret", "..", ".", "", "/etc/hosts",
                folder.resolve("secret").toString(), "..\\secret", "x/../../secret", "methane\0")) {
            assertFalse(source.has(id), id);
            assertEquals(Optional.empty(), source.load(id), id);
            assertFalse(builtIn.has(id), id);
            assertEquals(Optional.empty(), builtIn.load(id), id);
        }
        assertFalse(builtIn.has("../builtin/methane"));
        assertFalse(new FolderFuels(folder, 20).has("inner/../secret"));
    }

    @Test
    void aFileWithABadNameIsListedAndRefusedWithAReason() throws IOException {
        write("My Oil.yaml", oil("My Oil"));
        FolderFuels source = new FolderFuels(folder, 20);
        assertEquals(Set.of("My Oil"), source.ids());
        assertSame(FuelFileMessage.BAD_ID, assertThrows(InputException.class, () -> source.load("My Oil")).reason());
    }

    @Test
    void aUserFileHidesABuiltInFuelAndSaysSo() throws IOException {
        write("no-2-oil.yaml", oil("no-2-oil"));
        FuelLibrary library = new FuelLibrary(List.of(new BuiltInFuels(), new FolderFuels(folder, 20)));
        Fuel fuel = library.get("no-2-oil");
        assertEquals("My oil", fuel.title());
        assertSame(EngineMessage.HIDES_FUEL, fuel.notes().get(0).message());
        assertEquals("built-in fuels", fuel.notes().get(0).detail().found());
        assertTrue(fuel.notes().get(0).detail().where().endsWith("no-2-oil.yaml"));
        assertTrue(library.get("methane").notes().isEmpty());
    }

    @Test
    void aFaultyUserFileIsReportedRatherThanTheBuiltInFuelTaken() throws IOException {
        write("no-2-oil.yaml", oil("other"));
        FuelLibrary library = new FuelLibrary(List.of(new BuiltInFuels(), new FolderFuels(folder, 20)));
        assertSame(FuelFileMessage.ID_IS_NOT_FILE_NAME, assertThrows(InputException.class, () -> library.get("no-2-oil")).reason());
    }

    @Test
    void builtInFuelsAreLoadedOnce() {
        BuiltInFuels source = new BuiltInFuels();
        assertSame(source.load("methane").orElseThrow(), source.load("methane").orElseThrow());
        assertFalse(source.has("no-such-fuel"));
        assertThrows(UnsupportedOperationException.class, () -> source.ids().clear());
    }

    /** The jar is made without entries for folders, as some packers do. */
    @Test
    void builtInFuelsAreFoundInAJar() throws Exception {
        Path jar = folder.resolve("fuels with space.jar");
        Path classes = Path.of(BuiltInFuels.class.getProtectionDomain().getCodeSource().getLocation().toURI());
        if (Files.isRegularFile(classes)) {
            Files.copy(classes, jar);
        } else {
            pack(classes, jar);
        }
        try (URLClassLoader loader = new ChildFirst(jar.toUri().toURL())) {
            FuelSource source = (FuelSource) loader.loadClass(BuiltInFuels.class.getName()).getConstructor().newInstance();
            assertFalse(source instanceof BuiltInFuels);
            assertEquals(new BuiltInFuels().ids(), source.ids());
            assertEquals("Methane", source.load("methane").orElseThrow().title());
        }
    }

    private static void pack(Path classes, Path jar) throws IOException {
        try (OutputStream out = Files.newOutputStream(jar); ZipOutputStream zip = new ZipOutputStream(out);
                Stream<Path> files = Files.walk(classes)) {
            files.filter(Files::isRegularFile).forEach(file -> add(zip, classes.relativize(file).toString().replace('\\', '/'), file));
        }
    }

    private static void add(ZipOutputStream zip, String name, Path file) {
        try {
            zip.putNextEntry(new ZipEntry(name));
            Files.copy(file, zip);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Loads this module's classes from the jar, all others from the tests' own class path. */
    private static final class ChildFirst extends URLClassLoader {

        ChildFirst(URL jar) {
            super(new URL[] {jar}, FuelSourcesTest.class.getClassLoader());
        }

        @Override
        protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
            return name.startsWith("fluewright.fuels.") && findLoadedClass(name) == null ? findClass(name) : super.loadClass(name, resolve);
        }

        @Override
        public URL getResource(String name) {
            URL own = findResource(name);
            return own != null ? own : super.getResource(name);
        }
    }
}
