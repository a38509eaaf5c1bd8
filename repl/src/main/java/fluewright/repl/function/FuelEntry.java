package fluewright.repl.function;

/**
 * A fuel in a list.
 *
 * @param id    the id it is called by
 * @param phase how it comes to the burner; empty when its file cannot be read
 * @param title the name in words, or why its file cannot be read
 */
public record FuelEntry(String id, String phase, String title) {
}
