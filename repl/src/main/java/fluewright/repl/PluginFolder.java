package fluewright.repl;

import fluewright.engine.message.Detail;
import fluewright.engine.message.InputException;
import java.io.IOException;
import java.net.MalformedURLException;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The jars of a folder of plugins. Jars need no more than their service entries. */
final class PluginFolder {

    private PluginFolder() {
    }

    /**
     * Returns a loader of the project's classes and of the jars in a folder, in the order of their names.
     *
     * @param folder the folder, or null for none
     * @throws InputException when the folder cannot be read
     */
    static ClassLoader loader(Path folder) {
        ClassLoader own = PluginFolder.class.getClassLoader();
        return folder == null ? own : new URLClassLoader("plugins", jars(folder).toArray(URL[]::new), own);
    }

    private static List<URL> jars(Path folder) {
        List<Path> found = new ArrayList<>();
        try (DirectoryStream<Path> jars = Files.newDirectoryStream(folder, "*.jar")) {
            jars.forEach(found::add);
        } catch (IOException e) {
            throw new InputException(ShellMessage.NO_PLUGIN_FOLDER, Detail.at("--plugins").found(folder).expected("a folder that can be read"), e);
        }
        return found.stream().sorted().map(PluginFolder::url).toList();
    }

    private static URL url(Path jar) {
        try {
            return jar.toUri().toURL();
        } catch (MalformedURLException e) {
            throw new IllegalStateException(e);
        }
    }
}
