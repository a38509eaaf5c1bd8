package fluewright.fuels;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import fluewright.engine.message.InputException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;

/** Any bytes may be given to the reader of fuel files. */
class FuelFileBytesTest {

    /** Whatever the bytes are, the reader ends with a fuel or with an error for people. */
    @Property(tries = 300)
    void neverFailsOtherwise(@ForAll @IntRange(max = 260) int at, @ForAll byte changed, @ForAll @IntRange(max = 40) int cut) {
        byte[] bytes = FuelFileTest.OIL.getBytes(StandardCharsets.UTF_8);
        bytes[at] = changed;
        byte[] shortened = Arrays.copyOf(bytes, bytes.length - cut);
        try {
            FuelFile.parse(shortened, "my-oil.yaml", "my-oil");
        } catch (InputException e) {
            assertTrue(e.detail().where().startsWith("my-oil.yaml, line "), e.getMessage());
        }
    }

    @Property(tries = 300)
    void neverFailsOnAnyText(@ForAll String text) {
        assertThrows(InputException.class, () -> FuelFileTest.parse("my-oil", text));
    }
}
