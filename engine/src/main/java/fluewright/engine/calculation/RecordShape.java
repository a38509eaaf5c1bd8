package fluewright.engine.calculation;

import java.lang.reflect.Method;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The components of a declared record, groups opened.
 *
 * @param <T> the record
 */
public final class RecordShape<T extends Record> {

    private final Class<T> type;
    private final Map<String, Term> terms = new LinkedHashMap<>();
    private final RecordMaker maker;

    private RecordShape(Class<T> type) {
        this.type = type;
        this.maker = RecordMaker.of(type);
    }

    static <T extends Record> RecordShape<T> of(Class<T> type) {
        RecordShape<T> shape = new RecordShape<>(type);
        shape.collect(type, List.of());
        return shape;
    }

    private void collect(Class<?> record, List<Method> outer) {
        for (RecordComponent part : record.getRecordComponents()) {
            List<Method> path = new ArrayList<>(outer);
            path.add(accessor(part));
            Component declared = part.getAnnotation(Component.class);
            if (declared != null) {
                add(new Term(part.getName(), valueType(part), isOptional(part.getType()), declared, List.copyOf(path)));
            } else if (part.getType().isRecord()) {
                collect(part.getType(), path);
            } else {
                throw new IllegalStateException(record.getName() + "." + part.getName() + " needs a @Component");
            }
        }
    }

    private void add(Term term) {
        if (terms.put(term.name(), term) != null) {
            throw new IllegalStateException(type.getName() + " has two components named " + term.name());
        }
    }

    private static Method accessor(RecordComponent part) {
        part.getAccessor().setAccessible(true);
        return part.getAccessor();
    }

    /** Returns the components in the order of the record. */
    public Collection<Term> terms() {
        return terms.values();
    }

    /** Returns the names of the components. */
    public Collection<String> names() {
        return terms.keySet();
    }

    /** Returns the component of a name. */
    public Optional<Term> find(String name) {
        return Optional.ofNullable(terms.get(name));
    }

    /** Makes the record of its components' values, in the order of {@link #terms()}; null stands for left out. */
    T make(Iterator<Object> values) {
        return type.cast(maker.make(values));
    }

    private static boolean isOptional(Class<?> type) {
        return type == OptionalDouble.class || type == Optional.class;
    }

    private static Class<?> valueType(RecordComponent part) {
        if (part.getType() == OptionalDouble.class) {
            return double.class;
        }
        if (part.getType() == Optional.class) {
            return (Class<?>) ((ParameterizedType) part.getGenericType()).getActualTypeArguments()[0];
        }
        return part.getType();
    }
}
