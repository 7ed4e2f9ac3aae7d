package saltspoke.atlas.stations;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.Closeable;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.CRC32;
import saltspoke.values.Refusal;

/**
 * What an ingest has done so far, on disk: one record a file, each with its length and checksum. A
 * kill can only tear the last record, and opening cuts that off. While it is open nobody else can
 * open it; the system lets go of that lock when the program dies.
 */
final class IngestJournal implements Closeable {
  private static final int LARGEST = 1 << 28;

  private final RandomAccessFile file;
  private final RandomAccessFile lockFile;
  private final FileLock lock;
  private final Map<String, Long> records = new LinkedHashMap<>();

  private IngestJournal(RandomAccessFile file, RandomAccessFile lockFile, FileLock lock) {
    this.file = file;
    this.lockFile = lockFile;
    this.lock = lock;
  }

  /**
   * Opens the journal in a work folder, or begins it.
   *
   * @param setting what the outcomes depend on beside the files; another one begins anew
   * @throws Refusal when another ingest holds it
   */
  static IngestJournal open(Path folder, String setting) throws IOException {
    Path lockPath = folder.resolve("lock");
    RandomAccessFile lockFile;
    FileLock lock;
    do {
      Files.createDirectories(folder);
      lockFile = new RandomAccessFile(lockPath.toFile(), "rw");
      lock = tryLock(lockFile);
      if (lock == null) {
        lockFile.close();
        throw Refusal.wrongUse(
            "busy-data-set", "into", folder, "wait until the other ingest into it has ended");
      }
      // An ingest that just ended took the file away between our opening and our locking it.
    } while (!Files.exists(lockPath));
    RandomAccessFile file = new RandomAccessFile(folder.resolve("journal").toFile(), "rw");
    IngestJournal journal = new IngestJournal(file, lockFile, lock);
    journal.recover(setting);
    return journal;
  }

  private static FileLock tryLock(RandomAccessFile file) throws IOException {
    try {
      return file.getChannel().tryLock();
    } catch (OverlappingFileLockException e) {
      return null;
    }
  }

  private void recover(String setting) throws IOException {
    long good = 0;
    try {
      while (good < file.length()) {
        byte[] record = record(good);
        String key = new DataInputStream(new ByteArrayInputStream(record)).readUTF();
        if (good == 0 && !key.equals(setting)) {
          break;
        }
        if (good > 0) {
          records.put(key, good);
        }
        good = file.getFilePointer();
      }
    } catch (EOFException | TornRecord e) {
      // What follows was being written when the program was killed; it is cut off below.
    }
    file.setLength(good);
    if (good == 0) {
      append(
          setting,
          out -> {
            // The first record has no outcome.
          });
      records.clear();
    }
  }

  /** A record whose checksum does not fit. */
  private static final class TornRecord extends IOException {
    private static final long serialVersionUID = 1L;
  }

  private byte[] record(long at) throws IOException {
    file.seek(at);
    int length = file.readInt();
    if (length < 0 || length > LARGEST || at + length > file.length()) {
      throw new TornRecord();
    }
    byte[] record = new byte[length];
    file.readFully(record);
    if (file.readInt() != checksum(record)) {
      throw new TornRecord();
    }
    return record;
  }

  private static int checksum(byte[] record) {
    CRC32 crc = new CRC32();
    crc.update(record);
    return (int) crc.getValue();
  }

  /** Whether a file is done. */
  synchronized boolean has(String key) {
    return records.containsKey(key);
  }

  synchronized void add(String key, FileOutcome outcome) throws IOException {
    append(key, out -> OutcomeCodec.write(outcome, out));
  }

  private interface Body {
    void write(DataOutputStream out) throws IOException;
  }

  private void append(String key, Body body) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    DataOutputStream out = new DataOutputStream(bytes);
    out.writeUTF(key);
    body.write(out);
    byte[] record = bytes.toByteArray();
    ByteArrayOutputStream whole = new ByteArrayOutputStream(record.length + 8);
    DataOutputStream framed = new DataOutputStream(whole);
    framed.writeInt(record.length);
    framed.write(record);
    framed.writeInt(checksum(record));
    long at = file.length();
    file.seek(at);
    file.write(whole.toByteArray());
    records.put(key, at);
  }

  /** The outcome of a file that is done. */
  synchronized FileOutcome get(String key) throws IOException {
    DataInputStream in = new DataInputStream(new ByteArrayInputStream(record(records.get(key))));
    in.readUTF();
    return OutcomeCodec.read(in);
  }

  @Override
  public void close() throws IOException {
    file.close();
    lock.release();
    lockFile.close();
  }
}
