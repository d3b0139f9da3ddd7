package org.archspan.modelfile;

import java.util.List;
import java.util.Optional;

/**
 * The outcome of reading a model.
 *
 * @param model  present when there is no fault
 * @param faults all that is wrong, in the order of the file
 */
public record Reading(Optional<Model> model, List<Diagnostic> faults) {
}
