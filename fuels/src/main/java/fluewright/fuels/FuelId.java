package fluewright.fuels;

import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** The rule for ids, which are file names too: nothing in them can lead out of a folder. */
final class FuelId {

    /** What a file name adds to the id. */
    static final String SUFFIX = ".yaml";

    private static final Pattern RULE = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");
    private static final int LENGTH = 60;

    private FuelId() {
    }

    /** Tells whether a text can be an id. */
    static boolean isValid(String id) {
        return id.length() <= LENGTH && RULE.matcher(id).matches();
    }

    /** Returns what the names of fuel files promise as ids, sorted; other names are left out. */
    static Set<String> ofNames(Stream<String> names) {
        return names.filter(name -> name.endsWith(SUFFIX)).map(name -> name.substring(0, name.length() - SUFFIX.length()))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    /**
     * Returns the id that a file states.
     *
     * @param promised the id that the file's name promises
     * @throws fluewright.engine.message.InputException when it is no id, or not the promised one
     */
    static String require(Text stated, String promised) {
        if (!isValid(stated.value())) {
            throw stated.at().error(FuelFileMessage.BAD_ID, stated.value(), "an id such as no-2-oil, of " + LENGTH + " letters at most");
        }
        if (!stated.value().equals(promised)) {
            throw stated.at().error(FuelFileMessage.ID_IS_NOT_FILE_NAME, stated.value(),
                    "id: " + promised + ", or the file renamed to " + stated.value() + SUFFIX);
        }
        return stated.value();
    }
}
