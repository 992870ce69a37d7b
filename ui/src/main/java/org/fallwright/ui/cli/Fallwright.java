package org.fallwright.ui.cli;

/** Start of the program. */
public final class Fallwright {
  private Fallwright() {}

  public static void main(String[] args) {
    System.out.println("x");
  }
}
