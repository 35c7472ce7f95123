package org.ductledger.catalogue;

import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The functions by name, in the order of their families. */
public final class Catalogue {
    private final String version;
    private final Map<String, FunctionEntry> entries = new LinkedHashMap<>();

    /**
     * A catalogue of these entries.
     *
     * @param version the library's version
     * @throws IllegalArgumentException if a name stands twice
     */
    public Catalogue(String version, List<FunctionEntry> entries) {
        this.version = version;
        for (FunctionEntry entry : entries) {
            if (this.entries.put(entry.name(), entry) != null) {
                throw new IllegalArgumentException(entry.name() + " is in the catalogue twice");
            }
        }
    }

    public String version() {
        return version;
    }

    public Collection<FunctionEntry> entries() {
        return Collections.unmodifiableCollection(entries.values());
    }

    public Optional<FunctionEntry> find(String name) {
        return Optional.ofNullable(entries.get(name));
    }

    /** Up to three names that a mistyped one may have meant, the nearest first. */
    public List<String> near(String name) {
        return Spelling.near(name, entries.keySet(), 3);
    }
}
