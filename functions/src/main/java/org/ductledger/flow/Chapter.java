package org.ductledger.flow;

import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.Family;

/** A family as its file writes it: begins the entries under the family's heading. */
record Chapter(Family family) {
    Chapter(String name, String title) {
        this(new Family(name, title));
    }

    EntryBuilder entry(String functionName) {
        return new EntryBuilder(family, functionName);
    }
}
