package fluewright.fuels;

import fluewright.engine.message.InputException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionEndEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.DocumentStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.ReaderException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.ScalarNode;

/** Turns the bytes of a fuel file into its keys and values; refuses what is no single, flat YAML document. */
final class YamlDocument {

    /** A fuel file has three levels; the limit keeps a hostile file from exhausting the stack. */
    private static final int DEPTH = 8;
    private static final String BYTE_ORDER_MARK = "\uFEFF";

    private final String file;
    private final LoadSettings settings;
    private int depth;
    private int documents;

    private YamlDocument(String file) {
        this.file = file;
        // A list as a key is refused later, with its place; the parser would refuse it without one.
        this.settings = LoadSettings.builder().setLabel(file).setAllowNonScalarKeys(true).build();
    }

    /**
     * Returns the top section of a file.
     *
     * @throws InputException when the bytes are no single YAML document of keys and values
     */
    static Section read(String file, byte[] bytes) {
        YamlDocument document = new YamlDocument(file);
        String text = document.decoded(bytes);
        try {
            new Parse(document.settings).parseString(text).forEach(document::check);
            return document.top(new Compose(document.settings).composeString(text));
        } catch (MarkedYamlEngineException e) {
            throw document.notYaml(FilePosition.of(file, e.getProblemMark().or(e::getContextMark)), e.getProblem(), e);
        } catch (ReaderException e) {
            throw document.notYaml(document.position(text, e), String.format("character U+%04X", e.getCodePoint()), e);
        } catch (YamlEngineException e) {
            throw document.notYaml(FilePosition.start(file), e.getMessage(), e);
        }
    }

    private String decoded(byte[] bytes) {
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
        CharBuffer text = CharBuffer.allocate(bytes.length);
        CoderResult result = decoder.decode(ByteBuffer.wrap(bytes), text, true);
        String read = text.flip().toString();
        if (result.isError()) {
            throw FilePosition.after(file, read).error(FuelFileMessage.NOT_UTF8, "a byte that is none", "text stored as UTF-8");
        }
        return read.startsWith(BYTE_ORDER_MARK) ? read.substring(1) : read;
    }

    /** Runs on the stream of events, which needs no stack, before the tree is built, which does. */
    private void check(Event event) {
        FilePosition at = FilePosition.of(file, event.getStartMark());
        if (event instanceof DocumentStartEvent && ++documents > 1) {
            throw at.error(FuelFileMessage.SEVERAL_DOCUMENTS, "a second document", "one document");
        }
        if (event instanceof AliasEvent || event instanceof NodeEvent node && node.getAnchor().isPresent()) {
            throw at.error(FuelFileMessage.ALIAS, "an anchor (&) or alias (*)",
                    "the value itself; a text that begins with & or * in quotes");
        }
        depth += event instanceof CollectionStartEvent ? 1 : event instanceof CollectionEndEvent ? -1 : 0;
        if (depth > DEPTH) {
            throw at.error(FuelFileMessage.TOO_DEEP, "level " + depth, "three levels of keys");
        }
    }

    private Section top(Optional<Node> root) {
        Node node = root.filter(n -> !(n instanceof ScalarNode scalar && scalar.getValue().isBlank())).orElseThrow(() ->
                FilePosition.start(file).error(FuelFileMessage.EMPTY, "nothing", "keys such as id, title, phase, composition"));
        return Section.of(FilePosition.of(file, node.getStartMark()), node);
    }

    private InputException notYaml(FilePosition at, String problem, Exception cause) {
        return new InputException(FuelFileMessage.NOT_YAML, at.error(FuelFileMessage.NOT_YAML, problem,
                "YAML 1.2, such as key: value").detail(), cause);
    }

    private FilePosition position(String text, ReaderException e) {
        int end = text.offsetByCodePoints(0, Math.min(e.getPosition(), text.codePointCount(0, text.length())));
        return FilePosition.after(file, text.substring(0, end));
    }
}
