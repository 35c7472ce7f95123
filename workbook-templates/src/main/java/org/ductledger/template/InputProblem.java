package org.ductledger.template;

/**
 * Why an input is refused.
 *
 * @param input its name, as given or as required
 * @param required what is required, in words
 * @param given what was given, in words; {@code nothing} where it is missing
 */
public record InputProblem(String input, String required, String given) {
    public String detail() {
        return input + " requires " + required + ", got " + given;
    }
}
