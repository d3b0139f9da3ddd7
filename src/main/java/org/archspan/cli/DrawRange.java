package org.archspan.cli;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * A range of draws on the command line.
 *
 * @param first index of the first
 * @param end   index after the last
 */
record DrawRange(long first, long end) {
  /** More than a point of the sequence can be asked for. */
  private static final long LAST = Integer.MAX_VALUE;

  /**
   * One of several parts of nearly equal size that leave no gap.
   *
   * @param group draws that stay together
   */
  DrawRange part(Part part, int group) {
    return new DrawRange(cut(part.index() - 1, part, group), cut(part.index(), part, group));
  }

  private long cut(long index, Part part, int group) {
    if (index == 0 || index == part.count()) {
      return index == 0 ? first : end;
    }
    long at = first + Math.round((double) (end - first) * index / part.count());
    return Math.max(first, Math.min(end, at / group * group));
  }

  /** Reads {@code N} or {@code FIRST:END}. */
  static final class Converter implements ITypeConverter<DrawRange> {
    @Override
    public DrawRange convert(String text) {
      if (text.matches("([0-9]{1,12}:)?[0-9]{1,12}")) {
        String[] ends = text.split(":");
        long first = ends.length == 1 ? 0 : Long.parseLong(ends[0]);
        long end = Long.parseLong(ends[ends.length - 1]);
        if (first < end && end <= LAST) {
          return new DrawRange(first, end);
        }
      }
      throw new TypeConversionException("\"" + text + "\" is neither a number of draws nor FIRST:END with FIRST"
          + " below END, and END at most " + LAST);
    }
  }

  /**
   * One part of several.
   *
   * @param index from 1
   * @param count of all
   */
  record Part(int index, int count) {
    /** Reads {@code 3/64}. */
    static final class Converter implements ITypeConverter<Part> {
      @Override
      public Part convert(String text) {
        if (text.matches("[0-9]{1,6}/[0-9]{1,6}")) {
          String[] numbers = text.split("/");
          Part part = new Part(Integer.parseInt(numbers[0]), Integer.parseInt(numbers[1]));
          if (part.index >= 1 && part.index <= part.count) {
            return part;
          }
        }
        throw new TypeConversionException("\"" + text + "\" is not a part such as 3/64");
      }
    }
  }
}
