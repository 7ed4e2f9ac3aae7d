package saltspoke.sources;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Enumeration;
import java.util.Locale;
import java.util.function.Predicate;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import org.apache.commons.compress.archivers.ar.ArArchiveEntry;
import org.apache.commons.compress.archivers.ar.ArArchiveInputStream;
import org.apache.commons.compress.archivers.tar.TarArchiveEntry;
import org.apache.commons.compress.archivers.tar.TarArchiveInputStream;
import org.apache.commons.compress.compressors.xz.XZCompressorInputStream;
import saltspoke.values.Refusal;

/**
 * Reads package archives as registries serve them. Formats: gzip (RFC 1952) of tar (POSIX.1-2001
 * ustar/pax) for npm packages and Python source archives; Debian binary packages per deb(5), an ar
 * archive whose member {@code data.tar.xz} (or {@code .gz}) holds the files; ZIP (PKWARE APPNOTE)
 * for Python wheels (PEP 427) and jars.
 */
final class PackageArchive {
  private PackageArchive() {}

  static void read(Path file, Predicate<String> wanted, SourcePackages.EntryReader reader)
      throws IOException {
    String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
    try {
      if (name.endsWith(".whl") || name.endsWith(".jar") || name.endsWith(".zip")) {
        readZip(file, wanted, reader);
      } else if (name.endsWith(".tgz") || name.endsWith(".tar.gz")) {
        try (InputStream in = new GZIPInputStream(buffered(file), 1 << 16)) {
          readTar(in, wanted, reader);
        }
      } else if (name.endsWith(".deb")) {
        readDeb(file, wanted, reader);
      } else {
        throw Refusal.wrongUse("unknown-archive", "file", file, ".tgz, .tar.gz, .deb, .whl, .jar");
      }
    } catch (IOException e) {
      throw damaged(file, e);
    }
  }

  private static InputStream buffered(Path file) throws IOException {
    return new BufferedInputStream(Files.newInputStream(file), 1 << 16);
  }

  private static Refusal damaged(Path file, IOException e) {
    return Refusal.dataDamaged(
        "damaged-archive", file.toString(), String.valueOf(e.getMessage()), "fetch it again");
  }

  private static void readZip(
      Path file, Predicate<String> wanted, SourcePackages.EntryReader reader) throws IOException {
    try (ZipFile zip = new ZipFile(file.toFile())) {
      Enumeration<? extends ZipEntry> entries = zip.entries();
      while (entries.hasMoreElements()) {
        ZipEntry entry = entries.nextElement();
        if (!entry.isDirectory() && wanted.test(entry.getName())) {
          try (InputStream content = zip.getInputStream(entry)) {
            reader.read(entry.getName(), content);
          }
        }
      }
    }
  }

  private static void readDeb(
      Path file, Predicate<String> wanted, SourcePackages.EntryReader reader) throws IOException {
    try (ArArchiveInputStream ar = new ArArchiveInputStream(buffered(file))) {
      for (ArArchiveEntry member = ar.getNextEntry(); member != null; member = ar.getNextEntry()) {
        if (member.getName().equals("data.tar.xz")) {
          readTar(new XZCompressorInputStream(ar), wanted, reader);
          return;
        }
        if (member.getName().equals("data.tar.gz")) {
          readTar(new GZIPInputStream(ar), wanted, reader);
          return;
        }
      }
    }
    throw Refusal.dataDamaged(
        "damaged-archive", file.toString(), "", "a Debian package with data.tar.xz or data.tar.gz");
  }

  private static void readTar(
      InputStream in, Predicate<String> wanted, SourcePackages.EntryReader reader)
      throws IOException {
    TarArchiveInputStream tar = new TarArchiveInputStream(in);
    for (TarArchiveEntry entry = tar.getNextEntry(); entry != null; entry = tar.getNextEntry()) {
      if (entry.isFile() && wanted.test(entry.getName())) {
        reader.read(entry.getName(), tar);
      }
    }
  }
}
