package fluewright.fuels;

import java.nio.file.Path;
import java.util.Optional;

/** The fuels that a site shares: those of the folder that the environment variable FLUEWRIGHT_SITE_FUELS names. */
public final class SiteFuels extends FolderFuels {

    /** The environment variable that names the folder; without it there are none. */
    public static final String VARIABLE = "FLUEWRIGHT_SITE_FUELS";

    /** Makes the source; nothing is read yet. */
    public SiteFuels() {
        super(folder(System.getenv(VARIABLE)), 10);
    }

    /** Returns the folder that the variable's content names, or none. */
    static Optional<Path> folder(String named) {
        return Optional.ofNullable(named).filter(name -> !name.isBlank()).map(Path::of);
    }
}
