package org.fallwright.core.statics;

/**
 * What a source gives, all referred to the tree.
 *
 * @param lowN the pull that can be counted on [N]
 * @param holdN what it holds at its low [N]
 * @param highN the most it can do, its allowances included [N]
 * @param captured whether its end of the line stays while holding
 * @param stop what keeps it below the ceiling
 * @param overrunM line that still comes in after "stop", at the tree [m]; only for a reader
 */
public record SourceAtTree(
    double lowN, double holdN, double highN, boolean captured, Stop stop, double overrunM) {
  /** What keeps a source below the ceiling. */
  public enum Stop {
    NONE,
    /** A person reading a load cell. */
    READER,
    /** An overload device or weak link set at the ceiling. */
    DEVICE
  }
}
