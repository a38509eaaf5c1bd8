package fluewright.fuels;

import java.nio.file.Path;

/** The fuels of the user: those of the folder {@code .fluewright/fuels} in the home folder. */
public final class UserFuels extends FolderFuels {

    /** Makes the source; nothing is read yet. */
    public UserFuels() {
        super(Path.of(System.getProperty("user.home"), ".fluewright", "fuels"), 20);
    }
}
