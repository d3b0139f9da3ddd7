package org.archspan.report;

import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.SelfGravity;

/** What limits answers that were made for many cases of one model. */
final class Limits {
  private Limits() {
  }

  /** Adds the sentences that hold for every case. */
  static void add(TextBlock block, Disk disk) {
    block.bullet("Linear theory on a static base state that varies with height alone; "
        + leftOut(disk.rotation().isPresent(), disk.selfGravity()) + " not in it.");
  }

  private static String leftOut(boolean rotates, SelfGravity selfGravity) {
    String motion = rotates ? "shear" : "rotation, shear";
    return switch (selfGravity) {
      case OFF -> motion + " and the gas's own gravity are";
      case EQUILIBRIUM -> motion + " and the gravity of the perturbation itself are";
      case FULL -> rotates ? "shear is" : "rotation and shear are";
    };
  }

  /** Which amount of gas stays the same while other inputs change: that which the model gives. */
  static String held(Disk disk) {
    boolean column = disk.gas() instanceof Gas.Isothermal one && one.surfaceDensity().isPresent()
        || disk.gas() instanceof Gas.Layered layers && layers.surfaceDensity().isPresent();
    if (disk.gas() instanceof Gas.Stratified) {
      return "the prescribed stratification";
    }
    return column ? "the surface density that the model gives; the density at the lower end follows"
        : "the density at the lower end that the model gives; the surface density follows (give gas.surface-density"
        + " to hold that)";
  }
}
