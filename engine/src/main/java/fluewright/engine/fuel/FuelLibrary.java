package fluewright.engine.fuel;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.message.Note;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;
import java.util.Set;
import java.util.TreeSet;

/** All fuels of all sources, the highest-ranking source first; each is read when it is asked for. */
public final class FuelLibrary {

    private final List<FuelSource> sources;

    /** Makes a library of sources. */
    public FuelLibrary(List<FuelSource> sources) {
        this.sources = new ArrayList<>(sources);
        this.sources.sort(Comparator.comparingInt(FuelSource::rank).reversed());
    }

    /** Makes a library of the sources that a class loader provides as services. */
    public static FuelLibrary of(ClassLoader loader) {
        List<FuelSource> found = new ArrayList<>();
        ServiceLoader.load(FuelSource.class, loader).forEach(found::add);
        return new FuelLibrary(found);
    }

    /** Returns the ids of all fuels, sorted. */
    public Set<String> ids() {
        Set<String> ids = new TreeSet<>();
        sources.forEach(source -> ids.addAll(source.ids()));
        return ids;
    }

    /**
     * Returns the fuel of an id.
     *
     * @throws InputException when no source has it, or its file cannot be read
     */
    public Fuel get(String id) {
        for (int i = 0; i < sources.size(); i++) {
            Optional<Fuel> fuel = sources.get(i).load(id);
            if (fuel.isPresent()) {
                return withHidden(fuel.get(), sources.subList(i + 1, sources.size()));
            }
        }
        throw new InputException(EngineMessage.UNKNOWN_FUEL, Detail.at("fuel").found(id)
                .expected("one of " + ids().size() + " fuels; 'fuels' lists them").nearest(NearestName.of(id, ids())));
    }

    private static Fuel withHidden(Fuel fuel, List<FuelSource> lower) {
        List<Note> notes = new ArrayList<>(fuel.notes());
        lower.stream().filter(source -> source.has(fuel.id())).forEach(source -> notes.add(new Note(
                Note.Level.REMARK, EngineMessage.HIDES_FUEL, Detail.at(fuel.origin()).found(source.place()))));
        return new Fuel(fuel.id(), fuel.title(), fuel.phase(), fuel.makeup(), fuel.heat(), fuel.gas(), fuel.density(),
                fuel.factorClass(), notes, fuel.sources(), fuel.origin());
    }
}
