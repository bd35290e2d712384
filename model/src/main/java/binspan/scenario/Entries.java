package binspan.scenario;

import java.util.AbstractMap;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;

/** Entries by scenario path that never change and keep the order of the file, so that studies draw and reports list in the same order every time. */
final class Entries<V> extends AbstractMap<String, V> {
    private final Map<String, V> entries;

    private Entries(Map<String, V> entries) {
        this.entries = Collections.unmodifiableMap(new LinkedHashMap<>(entries));
    }

    /** A copy, or the same object where it never changes anyway. */
    static <V> Map<String, V> copyOf(Map<String, V> entries) {
        return entries instanceof Entries<V> ? entries : new Entries<>(entries);
    }

    @Override
    public Set<Entry<String, V>> entrySet() {
        return entries.entrySet();
    }

    @Override
    public boolean containsKey(Object key) {
        return entries.containsKey(key);
    }

    @Override
    public V get(Object key) {
        return entries.get(key);
    }
}
