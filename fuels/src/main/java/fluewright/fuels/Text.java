package fluewright.fuels;

import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.quantity.Value;
import fluewright.engine.quantity.ValueText;
import java.util.Collection;
import java.util.Set;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.Tag;

/**
 * A scalar of a fuel file as it was written, with its place. Scalars are never turned into YAML's own types, so that
 * {@code no}, {@code 010} and {@code 1e3} stay what the author typed.
 *
 * @param value the text, white space folded
 * @param at    where it stands
 */
record Text(String value, FilePosition at) {

    private static final Set<Tag> PLAIN = Set.of(Tag.STR, Tag.INT, Tag.FLOAT, Tag.BOOL, Tag.NULL);

    /**
     * Returns the text of a node.
     *
     * @throws InputException when the node is no plain scalar
     */
    static Text of(String file, Node node) {
        FilePosition at = FilePosition.of(file, node.getStartMark());
        if (!(node instanceof ScalarNode scalar) || !PLAIN.contains(node.getTag())) {
            throw at.error(FuelFileMessage.WRONG_TYPE, kind(node), "a text or a number with its unit");
        }
        // Unicode white space, because numbers copied from documents bring no-break spaces along.
        String folded = scalar.getValue().replaceAll("(?U)\\s+", " ").strip();
        folded.chars().filter(Character::isISOControl).findFirst().ifPresent(c -> {
            throw at.error(FuelFileMessage.CONTROL_CHARACTER, String.format("U+%04X", c), "text that can be printed");
        });
        return new Text(folded, at);
    }

    /** Returns what a node is, for people. */
    static String kind(Node node) {
        return switch (node.getNodeType()) {
            case MAPPING -> "keys and values";
            case SEQUENCE -> "a list";
            case SCALAR -> PLAIN.contains(node.getTag()) ? "a text" : "a value tagged " + node.getTag().getValue();
            default -> "something else";
        };
    }

    /**
     * Returns this text when something is in it.
     *
     * @throws InputException when it is empty
     */
    Text filled(String key) {
        if (value.isEmpty()) {
            throw at.error(FuelFileMessage.MISSING_VALUE, key + " without a value", "a text");
        }
        return this;
    }

    /**
     * Returns this text when it is one of the valid words.
     *
     * @throws InputException when it is another
     */
    String oneOf(Collection<String> valid) {
        if (!valid.contains(value)) {
            throw at.error(FuelFileMessage.UNKNOWN_WORD, value, valid, NearestName.of(value, valid));
        }
        return value;
    }

    /**
     * Returns the number with its unit.
     *
     * @param example how such a number is written
     * @throws InputException when it is no finite number, or the unit is missing or unknown
     */
    Value<?> number(String example) {
        if (value.matches(".*[0-9],[0-9].*")) {
            throw at.error(FuelFileMessage.DECIMAL_COMMA, value, "a number such as " + example);
        }
        Value<?> number = parsed();
        if (number.named().symbol().equals("1")) {
            throw at.error(FuelFileMessage.NUMBER_WITHOUT_UNIT, value, "a number and its unit, such as " + example);
        }
        return number;
    }

    /**
     * Returns the number with its unit.
     *
     * @throws InputException when it is zero or less besides
     */
    Value<?> positive(String example) {
        Value<?> number = number(example);
        if (!(number.number() > 0)) {
            throw at.error(FuelFileMessage.NOT_POSITIVE, value, "a number such as " + example);
        }
        return number;
    }

    private Value<?> parsed() {
        try {
            return ValueText.parse(value);
        } catch (InputException e) {
            throw at.relocated(e);
        }
    }
}
