package fluewright.fuels;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelSource;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/**
 * The fuels of a folder, one a file. A file is read each time it is asked for, so that an edit counts at once; a folder
 * that is missing has none.
 */
public class FolderFuels implements FuelSource {

    private final Optional<Path> folder;
    private final int rank;

    /** Makes the source of a folder. */
    public FolderFuels(Path folder, int rank) {
        this(Optional.of(folder), rank);
    }

    /** Makes the source of a folder that may not be named at all. */
    FolderFuels(Optional<Path> folder, int rank) {
        this.folder = folder;
        this.rank = rank;
    }

    @Override
    public String place() {
        return folder.map(Path::toString).orElse("no folder");
    }

    @Override
    public int rank() {
        return rank;
    }

    /**
     * {@inheritDoc} They are the names of its fuel files, even of those that cannot be read as fuels.
     *
     * @throws fluewright.engine.message.InputException when the folder is there but may not be read
     */
    @Override
    public Set<String> ids() {
        if (folder.isEmpty() || !Files.isDirectory(folder.get())) {
            return Set.of();
        }
        try (Stream<Path> files = Files.list(folder.get())) {
            return FuelId.ofNames(files.filter(Files::isRegularFile).map(file -> file.getFileName().toString()));
        } catch (IOException e) {
            throw FuelFile.unreadable(place(), "no access: " + e.getClass().getSimpleName(), e);
        }
    }

    /** {@inheritDoc} A name that is no id is looked for among the folder's own file names only, so none leads out of it. */
    @Override
    public boolean has(String id) {
        return FuelId.isValid(id) ? folder.isPresent() && Files.isRegularFile(file(id)) : ids().contains(id);
    }

    /**
     * {@inheritDoc}
     *
     * @throws fluewright.engine.message.InputException when the folder has it but it cannot be read
     */
    @Override
    public Optional<Fuel> load(String id) {
        return has(id) ? Optional.of(FuelFile.read(file(id))) : Optional.empty();
    }

    private Path file(String id) {
        return folder.orElseThrow().resolve(id + FuelId.SUFFIX);
    }
}
