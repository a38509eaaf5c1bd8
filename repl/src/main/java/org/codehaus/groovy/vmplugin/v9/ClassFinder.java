package org.codehaus.groovy.vmplugin.v9;

import java.net.URI;
import java.util.Map;
import java.util.Set;

/**
 * Stands before Groovy's class of this name on the class path. Groovy's own lists every class of the
 * Java library at each start, only to remember which of them need no import; that is a quarter of the
 * time of a first evaluation. With nothing remembered, Groovy looks such a name up when it meets it.
 */
public final class ClassFinder {
    private ClassFinder() {
    }

    /** Finds nothing, so that no time is spent. */
    public static Map<String, Set<String>> find(URI place, String packageName, boolean recursive, boolean innerClasses) {
        return Map.of();
    }
}
