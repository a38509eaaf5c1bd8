package fluewright.fuels;

import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;

/** Keys and values of a fuel file, each with its place. */
final class Section {

    private final FilePosition at;
    private final Map<String, Text> keys = new LinkedHashMap<>();
    private final Map<String, Node> values = new LinkedHashMap<>();

    private Section(FilePosition at) {
        this.at = at;
    }

    /**
     * Returns the section that a node is.
     *
     * @param at where to report a missing key
     * @throws InputException when the node is something else, or a key stands twice
     */
    static Section of(FilePosition at, Node node) {
        if (node instanceof ScalarNode scalar && scalar.getValue().isBlank()) {
            throw at.error(FuelFileMessage.MISSING_VALUE, "a key without a value", "keys and values below it");
        }
        if (!(node instanceof MappingNode mapping)) {
            throw FilePosition.of(at.file(), node.getStartMark()).error(FuelFileMessage.WRONG_TYPE, Text.kind(node), "keys and values");
        }
        Section section = new Section(at);
        mapping.getValue().forEach(section::add);
        return section;
    }

    private void add(NodeTuple tuple) {
        Text key = Text.of(at.file(), tuple.getKeyNode());
        Text first = keys.putIfAbsent(key.value(), key);
        if (first != null) {
            throw key.at().error(FuelFileMessage.DUPLICATE_KEY, key.value(), "it once; it stands in line " + first.at().line() + " too");
        }
        values.put(key.value(), tuple.getValueNode());
    }

    /**
     * Returns this section when it has no keys but the valid ones.
     *
     * @throws InputException when it has others
     */
    Section only(Collection<String> valid) {
        keys.values().stream().filter(key -> !valid.contains(key.value())).findFirst().ifPresent(key -> {
            throw key.at().error(FuelFileMessage.UNKNOWN_KEY, key.value(), valid, NearestName.of(key.value(), valid));
        });
        return this;
    }

    /** Returns where the section begins. */
    FilePosition at() {
        return at;
    }

    /** Returns the keys with their places. */
    Collection<Text> keys() {
        return keys.values();
    }

    /** Returns the place of a key that is there. */
    FilePosition at(String key) {
        return keys.get(key).at();
    }

    /** Tells whether a key is there. */
    boolean has(String key) {
        return keys.containsKey(key);
    }

    /**
     * Returns the text of a key.
     *
     * @throws InputException when it is missing, empty or no text
     */
    Text text(String key) {
        return Text.of(at.file(), node(key)).filled(key);
    }

    /**
     * Returns the text of a key where the key is there.
     *
     * @throws InputException when it is empty or no text
     */
    Optional<Text> optionalText(String key) {
        return has(key) ? Optional.of(text(key)) : Optional.empty();
    }

    /**
     * Returns the source that the section states for its numbers.
     *
     * @throws InputException when it states none
     */
    String source() {
        boolean stated = has(FuelKeys.SOURCE) && !Text.of(at.file(), node(FuelKeys.SOURCE)).value().isEmpty();
        if (!stated) {
            throw at.error(FuelFileMessage.MISSING_SOURCE, "no source", "source: where the number comes from");
        }
        return text(FuelKeys.SOURCE).value();
    }

    /**
     * Returns the section below a key.
     *
     * @throws InputException when it is missing or no section
     */
    Section section(String key) {
        Node node = node(key);
        return of(at(key), node);
    }

    /**
     * Returns the section below a key where the key is there.
     *
     * @throws InputException when it is no section
     */
    Optional<Section> optionalSection(String key) {
        return has(key) ? Optional.of(section(key)) : Optional.empty();
    }

    private Node node(String key) {
        if (!has(key)) {
            throw at.error(FuelFileMessage.MISSING_KEY, keys.keySet().isEmpty() ? "nothing" : String.join(", ", keys.keySet()),
                    "the key " + key);
        }
        return values.get(key);
    }
}
