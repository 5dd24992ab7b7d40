package weighhouse.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import weighhouse.audit.AuditResult;
import weighhouse.audit.Brief;
import weighhouse.audit.Finding;
import weighhouse.audit.Gate;
import weighhouse.audit.Lapsed;
import weighhouse.report.IndexEntry;
import weighhouse.report.format.Format;
import weighhouse.report.text.Visible;
import weighhouse.workbook.UnreadableWorkbookException;

/** Audits one workbook, or several side by side; a bad one does not stop the rest. */
final class AuditRun {
  private record Done(IndexEntry entry, int status, List<String> summary, List<String> findings) {}

  private final Setting.Audits audits;
  private final Reports reports;
  private final Brief brief;
  private final Console console;
  private final boolean quiet;
  private Path firstPage;

  AuditRun(Setting.Audits audits, Reports reports, Brief brief, Console console, boolean quiet) {
    this.audits = audits;
    this.reports = reports;
    this.brief = brief;
    this.console = console;
    this.quiet = quiet;
  }

  /** Audits the files, named as their reports are; gives the exit status. */
  int audit(Map<String, Path> files) throws IOException, InterruptedException {
    List<Done> done = files.size() == 1 ? one(files) : several(files);
    int status = done.stream().mapToInt(Done::status).reduce(Status.PASS, Status::worst);
    if (files.size() > 1) {
      firstPage = reports.index(done.stream().map(Done::entry).toList());
    } else {
      String page = done.get(0).entry().reports().get(Format.HTML.text());
      firstPage = page == null ? null : reports.folder().resolve(page);
    }
    if (!quiet && firstPage != null && files.size() > 1) {
      console.say("All of them: " + Visible.text(firstPage.toString()));
    }
    List<String> found = done.stream().flatMap(one -> one.findings().stream()).toList();
    Lapsed.of(brief, found, LocalDate.now(ZoneId.systemDefault()))
        .forEach(sentence -> console.complain(Visible.text(sentence)));
    return status;
  }

  /** The page to open, if one was written. */
  Optional<Path> firstPage() {
    return Optional.ofNullable(firstPage);
  }

  private List<Done> one(Map<String, Path> files) {
    Map.Entry<String, Path> file = files.entrySet().iterator().next();
    console.passing("Auditing " + Visible.text(file.getKey()) + " …");
    Done done = audit(file.getKey(), file.getValue());
    console.passing("");
    report(done);
    return List.of(done);
  }

  private List<Done> several(Map<String, Path> files) throws InterruptedException {
    int threads = Math.min(files.size(), Runtime.getRuntime().availableProcessors());
    ExecutorService workers = Executors.newFixedThreadPool(threads);
    try {
      List<Future<Done>> futures = new ArrayList<>();
      files.forEach((name, file) -> futures.add(workers.submit(() -> audit(name, file))));
      List<Done> all = new ArrayList<>();
      for (Future<Done> future : futures) {
        console.passing(all.size() + " of " + futures.size() + " workbooks audited …");
        all.add(future.get());
        console.passing("");
        report(all.get(all.size() - 1));
      }
      return all;
    } catch (ExecutionException e) {
      throw new IllegalStateException(e.getCause());
    } finally {
      workers.shutdownNow();
    }
  }

  private void report(Done done) {
    if (done.entry().problem() != null) {
      console.complain(Visible.text(done.entry().problem()));
    } else if (!quiet) {
      done.summary().forEach(console::say);
    }
  }

  private Done audit(String name, Path file) {
    try {
      AuditResult result = audits.audit(file);
      Map<String, String> written = reports.write(name, result);
      boolean incomplete = Gate.of(result, brief.demands()).incomplete();
      List<String> summary = new Summary(result, console).lines(reports.folder(), written.values());
      return new Done(
          IndexEntry.of(name, result, written),
          incomplete ? Status.INCOMPLETE : Status.PASS,
          summary,
          result.findings().stream().map(Finding::id).toList());
    } catch (UnreadableWorkbookException e) {
      return failed(name, e.getMessage());
    } catch (IOException e) {
      return failed(name, Failures.sentence(e));
    } catch (RuntimeException | StackOverflowError e) {
      return failed(name, name + " could not be audited: " + Failures.UNEXPECTED);
    }
  }

  private static Done failed(String name, String problem) {
    return new Done(IndexEntry.failed(name, problem), Status.UNUSABLE, List.of(), List.of());
  }
}
