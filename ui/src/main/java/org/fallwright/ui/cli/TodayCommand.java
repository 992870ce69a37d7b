package org.fallwright.ui.cli;

import java.nio.file.Path;
import org.fallwright.core.revision.ChangeSlip;
import org.fallwright.core.revision.Found;
import org.fallwright.core.revision.Today;
import org.fallwright.core.site.Revision;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.Wetness;
import org.fallwright.core.store.SiteFile;
import org.fallwright.core.store.SiteFileException;
import org.fallwright.ui.home.Home;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
    name = "today",
    description =
        "Judge a setup as it is set on the day, print its change slip, and record the revision.")
final class TodayCommand extends AnswerCommand {
  @Option(
      names = "--setup",
      paramLabel = "RANK",
      description = "Rank of the setup in the plan; without it the last revision.")
  private Integer rank;

  @Option(
      names = "--line-at",
      paramLabel = "M",
      description = "Height at which the line seats [m].")
  private Double lineAt;

  @Option(names = "--line", paramLabel = "ID", description = "The line in the truck.")
  private String line;

  @Option(names = "--at", paramLabel = "ID", description = "Spot or anchor of the source.")
  private String at;

  @Option(
      names = "--redirect",
      paramLabel = "ID",
      description = "Anchor with the redirect block, or none.")
  private String redirect;

  @Option(names = "--ground", paramLabel = "WET|DRY", description = "The ground as found.")
  private Wetness ground;

  @Option(names = "--gust", paramLabel = "M/S", description = "Gusts as found [m/s].")
  private Double gust;

  @Option(
      names = "--record",
      paramLabel = "TIME",
      description = "Record the revision in the site file, with this date and time.")
  private String time;

  @Option(
      names = "--accepted-by",
      paramLabel = "NAME",
      description = "Who accepts it where the verdict is worse.")
  private String acceptedBy;

  TodayCommand(Home home) {
    super(home);
  }

  /** The slip's figures and, where it was recorded, the revision. */
  private record AsSet(Today today, Revision revision) {}

  @Override
  Answer answer(Asked asked) {
    Found found = new Found(lineAt, line, at, redirect, ground, gust);
    Site site = asked.site();
    Today today =
        rank == null && !site.revisions().isEmpty()
            ? Today.ofLast(site, asked.sources(), found)
            : Today.ofPlanned(
                site,
                asked.sources(),
                ranked(asked.plan(), rank == null ? 1 : rank).setup(),
                found);
    Revision revision = time == null ? null : today.revision(site, time, acceptedBy);
    if (revision != null) {
      write(Today.recorded(site, revision), asked.file());
    }
    return new Answer(
        "today",
        new AsSet(today, revision),
        out -> ChangeSlip.lines(site, today, revision).forEach(out::println),
        Exit.of(today.after().verdict()));
  }

  private static void write(Site site, Path file) {
    try {
      SiteFile.write(site, file);
    } catch (SiteFileException e) {
      throw new Refused(e.getMessage());
    }
  }
}
