package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.archspan.figure.DriverFigure;
import org.archspan.figure.FigureStyle;
import org.archspan.stability.WorkTerms;

/** What drives a mode and what resists it, by name, in units of the square of its growth rate: the shares add up to 1. */
final class Drivers {
  private static final double NEGLIGIBLE = 5e-4;

  /**
   * One term.
   *
   * @param name  what does the work
   * @param share of s^2, dimensionless; positive drives
   */
  record Term(String name, double share) {
    /** The share in words. */
    String words() {
      return String.format(Locale.ROOT, "%+.3f", share == 0.0 ? 0.0 : share);
    }

    String verdict() {
      return Math.abs(share) < NEGLIGIBLE ? "" : share > 0.0 ? "drives" : "resists";
    }
  }

  private Drivers() {
  }

  /** The terms in a fixed order; those that have no place in the problem are left out. */
  static List<Term> of(WorkTerms work) {
    double square = work.sum();
    List<Term> terms = new ArrayList<>();
    terms.add(new Term("weight of gas that sinks and is compressed", work.weight() / square));
    terms.add(new Term("stratification", work.stratification() / square));
    terms.add(new Term("tension of the field", work.fieldTension() / square));
    terms.add(new Term("compression of the field", work.fieldCompression() / square));
    terms.add(new Term("compression of the gas", work.gasCompression() / square));
    terms.add(new Term("compression of the cosmic rays", work.cosmicRayCompression() / square));
    if (work.selfGravity() != 0.0) {
      terms.add(new Term("the gas's own gravity", work.selfGravity() / square));
    }
    if (work.topSurface() != 0.0) {
      terms.add(new Term("free surface at the top", work.topSurface() / square));
    }
    return terms;
  }

  /** The bars; what does no work has none. */
  static DriverFigure figure(WorkTerms work, FigureStyle style) {
    return new DriverFigure(of(work).stream().filter(term -> term.share() != 0.0)
        .map(term -> new DriverFigure.Bar(term.name(), term.share())).toList(), style);
  }

  /** One sentence. */
  static String sentence(WorkTerms work) {
    return "In units of the square of the growth rate, to which all terms add up, it is driven by "
        + list(work, "drives") + "; what resists: " + list(work, "resists") + ".";
  }

  private static String list(WorkTerms work, String verdict) {
    return of(work).stream().filter(term -> term.verdict().equals(verdict))
        .map(term -> term.name() + " " + term.words()).collect(Collectors.joining(", "));
  }
}
