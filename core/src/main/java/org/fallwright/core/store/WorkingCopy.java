package org.fallwright.core.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Optional;
import org.fallwright.core.site.Site;

/**
 * What keeps a site's unsaved changes through a kill or a power cut: a draft beside the site file,
 * written whole after each change, and a mark that says who has the file open.
 *
 * <p>The draft is a site file of its own; it goes when the site is saved or given up. One that is
 * found when a file is opened is what was not saved the last time. The mark is a lock of the
 * operating system, so that it goes with the program, however that ends; on a medium that knows no
 * locks there is none, and two windows are then not noticed.
 */
public final class WorkingCopy implements AutoCloseable {
  private final Path file;
  private final Path draft;
  private final Path mark;
  private FileChannel channel;
  private FileLock lock;

  private WorkingCopy(Path file) {
    this.file = file;
    draft = file.resolveSibling("." + file.getFileName() + ".draft");
    mark = file.resolveSibling("." + file.getFileName() + ".open");
  }

  /**
   * Takes a file up.
   *
   * @throws SiteFileException one sentence, where another window or program has it open
   */
  public static WorkingCopy of(Path file) throws SiteFileException {
    WorkingCopy copy = new WorkingCopy(file.toAbsolutePath());
    copy.hold();
    return copy;
  }

  /** The site file. */
  public Path file() {
    return file;
  }

  /**
   * Changes that were not saved the last time; empty where there are none.
   *
   * @throws SiteFileException one sentence, where there is a draft that cannot be read; it is left
   *     where it is
   */
  public Optional<Site> unsaved() throws SiteFileException {
    return Files.exists(draft) ? Optional.of(SiteFile.read(draft)) : Optional.empty();
  }

  /**
   * Keeps the site as it is now; the site file stays as it is.
   *
   * @throws SiteFileException one sentence, where the draft cannot be written
   */
  public void keep(Site site) throws SiteFileException {
    SiteFile.write(site, draft);
  }

  /**
   * Saves the site into its file; the draft is then needed no more.
   *
   * @throws SiteFileException one sentence; the old file and the draft are then untouched
   */
  public void save(Site site) throws SiteFileException {
    SiteFile.write(site, file);
    giveUp();
  }

  /** Throws unsaved changes away. */
  public void giveUp() throws SiteFileException {
    try {
      Files.deleteIfExists(draft);
    } catch (IOException e) {
      throw new SiteFileException(
          draft.getFileName() + " cannot be removed; it holds changes that are no longer wanted.",
          e);
    }
  }

  /** Lets go of the file; a draft stays. */
  @Override
  public void close() {
    try {
      if (lock != null) {
        Files.deleteIfExists(mark);
        lock.release();
      }
      if (channel != null) {
        channel.close();
      }
    } catch (IOException e) {
      // the operating system lets go with the program
      lock = null;
    }
  }

  private void hold() throws SiteFileException {
    try {
      channel = FileChannel.open(mark, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      lock = channel.tryLock();
    } catch (OverlappingFileLockException e) {
      throw taken();
    } catch (IOException e) {
      return; // a medium without locks, or one that is only read
    }
    if (lock == null) {
      throw taken();
    }
  }

  private SiteFileException taken() {
    try {
      channel.close();
    } catch (IOException e) {
      channel = null;
    }
    return new SiteFileException(
        file.getFileName() + " is open in another window; close it there first.");
  }
}
