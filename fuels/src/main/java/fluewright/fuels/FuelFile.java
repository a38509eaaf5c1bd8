package fluewright.fuels;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.Detail;
import fluewright.engine.message.InputException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Reads fuel files. A fuel file is a YAML 1.2 text in UTF-8 that holds one fuel; its name is the fuel's id and
 * {@code .yaml}. This is the manual of its format.
 *
 * <pre>
 * id: no-2-oil                    # a to z, 0 to 9, hyphens; the name of the file
 * title: No. 2 fuel oil           # the name in words
 * phase: liquid                   # gas, liquid or solid
 * composition:
 *   basis: mass, as received      # see below
 *   source: where the shares come from
 *   shares:
 *     C: 87.0 %
 *     H: 12.6 %
 *     O: 0.1 %
 *     S: 0.3 %
 * gross-heating-value:            # may be left out
 *   value: 45.4 MJ/kg
 *   source: where the number comes from
 * density:                        # may be left out; not for gases
 *   value: 865 kg/m3
 *   source: where the number comes from
 * method-19: oil                  # may be left out
 * </pre>
 *
 * <ul>
 * <li>Every number carries its unit ({@code 87.0 %}, never {@code 87.0}) and has a decimal point. Every number has a
 * source; one from memory says so. Texts may be put in quotes.
 * <li>{@code basis} of a gas is {@code mole} (which is by volume of ideal gas) or {@code mass}. Of a liquid or solid it
 * is {@code mass, as received} (all shares make 100 %), {@code mass, dry} (all but moisture make 100 %; moisture is
 * that as received) or {@code mass, dry ash-free} (all but moisture and ash make 100 %; ash is that of the dry fuel,
 * moisture that as received).
 * <li>{@code shares} of a gas are of components by formula ({@code CH4}, {@code n-C4H10}, {@code nC4H10}) or by name
 * ({@code n-butane}), in % or, by mole, in ppm. Of a liquid or solid they are C, H, O, N, S, ash, moisture, in %; H and O
 * of the moisture are not in H and O. They make 100 % within 1 %; a sum that is not 100 % is scaled, and results say so.
 * <li>{@code gross-heating-value} is the measured one at 25 degC, on the basis of the composition; for a gas it may be
 * by mass, by mole, or by a volume at a stated state ({@code MJ/Nm3}, {@code MJ/Sm3}, {@code Btu/scf60}), taken as
 * ideal gas. Without it, a gas is valued by its composition and another fuel by an estimate, which results say.
 * <li>{@code density} of a liquid is that at about 15 degC.
 * <li>{@code method-19} is the fuel's row in Table 19-2 of EPA Method 19, such as {@code natural gas} or {@code oil}.
 * <li>A file has at most 1 MB; anchors, aliases and further documents are refused. {@code fuel.schema.json} beside this
 * class tells the format to editors.
 * </ul>
 *
 * <p>Errors are {@link InputException}s whose place is file, line and column; their reasons are those of
 * {@link FuelFileMessage}, and of the engine where it refuses the numbers.
 */
public final class FuelFile {

    private static final int LIMIT = 1_000_000;

    private FuelFile() {
    }

    /**
     * Returns the fuel of a file.
     *
     * @param file a file called by the fuel's id and {@code .yaml}
     * @throws InputException when the file cannot be read, or what it holds is no fuel
     */
    public static Fuel read(Path file) {
        String name = file.getFileName() == null ? "" : file.getFileName().toString();
        if (!name.endsWith(FuelId.SUFFIX)) {
            throw new InputException(FuelFileMessage.WRONG_FILE_NAME, Detail.at(file.toString()).found(name)
                    .expected("a name such as my-gas.yaml"));
        }
        return parse(bytes(file), file.toString(), name.substring(0, name.length() - FuelId.SUFFIX.length()));
    }

    private static byte[] bytes(Path file) {
        if (!Files.isRegularFile(file)) {
            throw unreadable(file.toString(), Files.exists(file) ? "something other than a file" : "no such file", null);
        }
        try (InputStream stream = Files.newInputStream(file)) {
            return bytes(stream, file.toString());
        } catch (IOException e) {
            throw unreadable(file.toString(), "no access: " + e.getClass().getSimpleName(), e);
        }
    }

    /** Reads one byte more than the limit at most, so that no file can fill the memory. */
    private static byte[] bytes(InputStream stream, String place) throws IOException {
        byte[] bytes = stream.readNBytes(LIMIT + 1);
        if (bytes.length > LIMIT) {
            throw new InputException(FuelFileMessage.TOO_LARGE, Detail.at(place).found("more than 1 MB")
                    .expected("a file of at most 1 MB"));
        }
        return bytes;
    }

    /** Returns the error of a file or folder that cannot be read. */
    static InputException unreadable(String place, String found, Throwable cause) {
        return new InputException(FuelFileMessage.UNREADABLE, Detail.at(place).found(found).expected("a file that may be read"), cause);
    }

    /**
     * Returns the fuel of a file's bytes.
     *
     * @param place the file, for people
     * @param id    the id that the file's name promises
     * @throws InputException when the bytes are no fuel
     */
    static Fuel parse(byte[] bytes, String place, String id) {
        return FuelContent.read(YamlDocument.read(place, bytes), id, place);
    }
}
