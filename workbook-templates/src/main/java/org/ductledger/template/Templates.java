package org.ductledger.template;

import java.util.List;
import java.util.Optional;
import org.ductledger.catalogue.Spelling;

/** The templates, the one list of them. */
public final class Templates {
    private static final List<Template> ALL = List.of(new NozzleSizing());

    private Templates() {}

    public static List<Template> all() {
        return ALL;
    }

    public static Optional<Template> find(String name) {
        return ALL.stream().filter(template -> template.name().equals(name)).findFirst();
    }

    /** Up to three names that a mistyped one may have meant, the nearest first. */
    public static List<String> near(String name) {
        return Spelling.near(name, ALL.stream().map(Template::name).toList(), 3);
    }
}
