package org.ductledger.template;

import org.ductledger.record.RecordedArgument.Origin;

/** What a template puts in the place of an argument: an input, a constant, or the result of an earlier call. */
public record Term(Origin origin) {}
