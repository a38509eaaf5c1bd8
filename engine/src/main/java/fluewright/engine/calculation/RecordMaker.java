package fluewright.engine.calculation;

import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.Iterator;
import java.util.Optional;
import java.util.OptionalDouble;

/** Makes a declared record, groups included, of the values of its components; what reflection tells is kept. */
final class RecordMaker {

    private final Constructor<?> constructor;
    private final Class<?>[] types;
    /** The maker of a group, null where the component is none. */
    private final RecordMaker[] groups;

    private RecordMaker(Constructor<?> constructor, Class<?>[] types, RecordMaker[] groups) {
        this.constructor = constructor;
        this.types = types;
        this.groups = groups;
    }

    static RecordMaker of(Class<?> record) {
        RecordComponent[] parts = record.getRecordComponents();
        Class<?>[] types = new Class<?>[parts.length];
        RecordMaker[] groups = new RecordMaker[parts.length];
        for (int i = 0; i < parts.length; i++) {
            types[i] = parts[i].getType();
            groups[i] = parts[i].isAnnotationPresent(Component.class) || !types[i].isRecord() ? null : of(types[i]);
        }
        return new RecordMaker(constructor(record, types), types, groups);
    }

    private static Constructor<?> constructor(Class<?> record, Class<?>[] types) {
        try {
            Constructor<?> constructor = record.getDeclaredConstructor(types);
            constructor.setAccessible(true);
            return constructor;
        } catch (NoSuchMethodException e) {
            throw new IllegalStateException(record.getName() + " is no record", e);
        }
    }

    Object make(Iterator<Object> values) {
        Object[] arguments = new Object[types.length];
        for (int i = 0; i < types.length; i++) {
            arguments[i] = groups[i] == null ? wrapped(types[i], values.next()) : groups[i].make(values);
        }
        return construct(arguments);
    }

    private static Object wrapped(Class<?> type, Object value) {
        if (type == OptionalDouble.class) {
            return value == null ? OptionalDouble.empty() : OptionalDouble.of((Double) value);
        }
        return type == Optional.class ? Optional.ofNullable(value) : value;
    }

    private Object construct(Object[] arguments) {
        try {
            return constructor.newInstance(arguments);
        } catch (InvocationTargetException e) {
            throw e.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(e.getCause());
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("cannot make " + constructor.getDeclaringClass().getName(), e);
        }
    }
}
