package org.archspan.gravity;

import java.util.List;
import java.util.function.Function;

/**
 * A gravity law as the model file names it: from this come reader, help, guide and messages.
 *
 * @param name    value of {@code gravity.law}
 * @param formula in the terms of its inputs
 * @param inputs  in the order in which the factory takes them
 * @param factory makes the law from the values of its inputs, CGS
 */
public record GravityLawKind(String name, String formula, List<LawInput> inputs,
    Function<double[], GravityLaw> factory) {
}
