package saltspoke.fields;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Supplier;
import java.util.stream.Stream;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.SourcePackage;
import saltspoke.sources.SourcePackages;
import saltspoke.values.Refusal;

/**
 * Builds a whole data folder from a folder of packages. Everything is written aside and put in
 * place at the end, so that a broken run leaves the old folder as it was. Two runs on the same
 * packages give the same bytes.
 */
public final class DefaultIngest {
  private final List<LayerBuilder> builders;
  private final List<SourcePackage> declared;
  private final Supplier<DataHome> tablesForNewFolder;

  /** An ingest of the declared packages with these builders, in this order. */
  public DefaultIngest(List<LayerBuilder> builders) {
    this(builders, SourcePackage.declared(), DataHome::shipped);
  }

  DefaultIngest(
      List<LayerBuilder> builders,
      List<SourcePackage> declared,
      Supplier<DataHome> tablesForNewFolder) {
    this.builders = List.copyOf(builders);
    this.declared = List.copyOf(declared);
    this.tablesForNewFolder = tablesForNewFolder;
  }

  /**
   * Builds the folder. Tables kept by hand, and files that the old folder's manifest does not know,
   * are taken over from the old folder; a new folder gets the tables of the shipped world.
   *
   * @param sourcesFolder packages as the registries serve them
   * @param target the data folder to write or replace
   * @throws Refusal when packages are missing, naming each with the way to fetch it, or when the
   *     target is something else than a data folder
   */
  public Manifest run(Path sourcesFolder, Path target, Progress progress) throws IOException {
    SourcePackages packages = SourcePackages.in(sourcesFolder, declared);
    refuseMissing(packages, sourcesFolder);
    if (Files.exists(target)
        && !Files.isRegularFile(target.resolve(Manifest.FILE_NAME))
        && !isEmptyOrTablesOnly(target)) {
      throw Refusal.wrongUse(
          "not-a-data-folder", "target", target, "an empty or new folder, or a data folder");
    }
    Path parent = target.toAbsolutePath().getParent();
    Files.createDirectories(parent);
    Path aside = parent.resolve(target.getFileName() + ".new-" + ProcessHandle.current().pid());
    Files.createDirectory(aside);
    try {
      Manifest manifest = build(packages, aside, target, progress);
      putInPlace(aside, target);
      return manifest;
    } finally {
      deleteTree(aside);
    }
  }

  /**
   * Takes changed tables of the folder {@code tables} into the manifest without building anything.
   */
  public static Manifest registerTables(Path dataFolder) throws IOException {
    Path file = dataFolder.resolve(Manifest.FILE_NAME);
    Manifest old =
        Files.isRegularFile(file)
            ? Manifest.read(Files.readAllBytes(file))
            : new Manifest(List.of(), List.of(), List.of());
    List<Manifest.Entry> files = new ArrayList<>(old.files());
    files.removeIf(f -> HandTables.owns(f.path()));
    files.addAll(HandTables.entries(dataFolder));
    return write(dataFolder, new Manifest(old.sources(), sorted(files), old.notes()));
  }

  private void refuseMissing(SourcePackages packages, Path folder) {
    Set<String> missing = new TreeSet<>();
    for (LayerBuilder builder : builders) {
      if (builder.fallBack().isEmpty()) {
        builder.needs().stream().filter(id -> !packages.has(id)).forEach(missing::add);
      }
    }
    if (!missing.isEmpty()) {
      List<String> fetch =
          declared.stream()
              .filter(p -> missing.contains(p.id()))
              .map(SourcePackage::howToFetch)
              .toList();
      throw Refusal.notFound(
          "missing-packages",
          folder.toString(),
          "no " + String.join(", ", missing),
          "fetch " + String.join("; ", fetch));
    }
  }

  private Manifest build(SourcePackages packages, Path aside, Path old, Progress progress)
      throws IOException {
    List<Manifest.Entry> files = new ArrayList<>();
    Set<String> used = new TreeSet<>();
    Set<String> notes = new LinkedHashSet<>();
    int done = 0;
    for (LayerBuilder builder : builders) {
      int part = done++;
      progress.report(part, builders.size(), builder.id());
      List<String> missing =
          builder.needs().stream().filter(id -> !packages.has(id)).sorted().toList();
      if (!missing.isEmpty()) {
        String note =
            builder.id()
                + " left out, without "
                + String.join(", ", missing)
                + ": "
                + builder.fallBack().orElseThrow();
        notes.add(note);
        progress.report(part, builders.size(), note);
        continue;
      }
      SourcePackages view = packages.freshView();
      FolderSink sink =
          new FolderSink(
              aside,
              note -> {
                notes.add(note);
                progress.report(part, builders.size(), note);
              });
      builder.build(view, sink);
      files.addAll(sink.entries(view.used()));
      used.addAll(view.used());
    }
    takeTables(old, aside);
    files.addAll(HandTables.entries(aside));
    progress.report(builders.size(), builders.size(), Manifest.FILE_NAME);
    List<Manifest.Source> sources = new ArrayList<>();
    for (String id : used) {
      sources.add(source(packages.get(id)));
    }
    return write(aside, new Manifest(sources, sorted(files), List.copyOf(notes)));
  }

  private static Manifest.Source source(SourcePackages.Found found) throws IOException {
    SourcePackage declared = found.declared();
    return new Manifest.Source(
        declared.id(),
        declared.registry().id(),
        declared.name(),
        found.version(),
        // A Debian client writes the epoch into the file name, the archive itself does not.
        found.file().getFileName().toString().replaceFirst("_\\d+(%3a|:)", "_"),
        declared.licence(),
        declared.attribution(),
        declared.notice(),
        Checksum.of(found.file()),
        Files.size(found.file()));
  }

  private static List<Manifest.Entry> sorted(List<Manifest.Entry> files) {
    return files.stream().sorted(Comparator.comparing(Manifest.Entry::path)).toList();
  }

  private static Manifest write(Path folder, Manifest manifest) throws IOException {
    Files.writeString(folder.resolve(Manifest.FILE_NAME), manifest.write(), StandardCharsets.UTF_8);
    return manifest;
  }

  private static boolean isEmptyOrTablesOnly(Path folder) throws IOException {
    try (Stream<Path> listing = Files.list(folder)) {
      return listing.allMatch(p -> p.getFileName().toString().equals(HandTables.FOLDER));
    }
  }

  private void takeTables(Path old, Path aside) throws IOException {
    Path tables = old.resolve(HandTables.FOLDER);
    if (Files.isDirectory(tables)) {
      copyMissing(tables, aside.resolve(HandTables.FOLDER), Set.of());
      return;
    }
    DataHome home = tablesForNewFolder.get();
    Optional<byte[]> manifest = home.find(Manifest.FILE_NAME);
    if (manifest.isPresent()) {
      for (Manifest.Entry entry : Manifest.read(manifest.get()).files()) {
        Optional<byte[]> table =
            HandTables.owns(entry.path()) ? home.find(entry.path()) : Optional.empty();
        if (table.isPresent()) {
          Files.createDirectories(aside.resolve(HandTables.FOLDER));
          Files.write(aside.resolve(entry.path()), table.get());
        }
      }
    }
  }

  private static void putInPlace(Path aside, Path target) throws IOException {
    if (!Files.exists(target)) {
      Files.move(aside, target);
      return;
    }
    Path manifest = target.resolve(Manifest.FILE_NAME);
    Set<Path> known = new LinkedHashSet<>();
    if (Files.isRegularFile(manifest)) {
      Manifest.read(Files.readAllBytes(manifest)).files().stream()
          .map(f -> target.resolve(f.path()))
          .forEach(known::add);
    }
    copyMissing(target, aside, known);
    Path retired = aside.resolveSibling(aside.getFileName() + ".old");
    Files.move(target, retired);
    Files.move(aside, target);
    deleteTree(retired);
  }

  /** Copies what the other folder lacks, except the files named. */
  private static void copyMissing(Path from, Path to, Set<Path> except) throws IOException {
    List<Path> files;
    try (Stream<Path> walk = Files.walk(from)) {
      files = walk.filter(Files::isRegularFile).filter(f -> !except.contains(f)).toList();
    }
    for (Path file : files) {
      Path copy = to.resolve(from.relativize(file).toString());
      if (!Files.exists(copy)) {
        Files.createDirectories(copy.getParent());
        Files.copy(file, copy, StandardCopyOption.COPY_ATTRIBUTES);
      }
    }
  }

  private static void deleteTree(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return;
    }
    List<Path> all;
    try (Stream<Path> walk = Files.walk(folder)) {
      all = walk.sorted(Comparator.reverseOrder()).toList();
    }
    for (Path path : all) {
      Files.delete(path);
    }
  }
}
