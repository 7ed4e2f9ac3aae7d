package saltspoke.sources;

import java.util.regex.Pattern;

/** The public registries that packages come from, with their way of naming a package's file. */
public enum Registry {
  /** Node packages: a gzipped tar, {@code name-version.tgz}. */
  NPM("npm") {
    @Override
    Pattern filePattern(String name) {
      return Pattern.compile(Pattern.quote(name) + "-(\\d[^/]*)\\.tgz");
    }

    @Override
    String fetchCommand(String name, String version) {
      return "npm pack " + name + "@" + version;
    }
  },
  /** Debian packages: {@code name_version_architecture.deb}; an epoch in the name is left out. */
  DEBIAN("debian") {
    @Override
    Pattern filePattern(String name) {
      return Pattern.compile(
          Pattern.quote(name) + "_(?:\\d+(?:%3a|:))?([^_/]+)_[a-z0-9]+\\.deb",
          Pattern.CASE_INSENSITIVE);
    }

    @Override
    String fetchCommand(String name, String version) {
      return "apt-get download " + name;
    }
  },
  /** Python packages: a wheel {@code name-version-….whl} or a source archive. */
  PYPI("pypi") {
    @Override
    Pattern filePattern(String name) {
      return Pattern.compile(
          // PEP 503 and PEP 427: a hyphen in a name may be written as an underscore.
          Pattern.quote(name.replace('-', '_')).replace("_", "\\E[-_]\\Q")
              + "-(\\d[^-/]*?)(?:-[^/]*\\.whl|\\.tar\\.gz)",
          Pattern.CASE_INSENSITIVE);
    }

    @Override
    String fetchCommand(String name, String version) {
      return "pip download --no-deps " + name + "==" + version;
    }
  },
  /** Java packages: {@code artifact-version.jar}; the name is {@code group:artifact}. */
  MAVEN("maven") {
    @Override
    Pattern filePattern(String name) {
      return Pattern.compile(
          Pattern.quote(name.substring(name.indexOf(':') + 1)) + "-(\\d[^/]*)\\.jar");
    }

    @Override
    String fetchCommand(String name, String version) {
      return "mvn dependency:copy -Dartifact=" + name + ":" + version + " -DoutputDirectory=.";
    }
  };

  private final String id;

  Registry(String id) {
    this.id = id;
  }

  /** Lower-case name in tables. */
  public String id() {
    return id;
  }

  /** Matches the file names of a package; group 1 is the version. */
  abstract Pattern filePattern(String name);

  /** The ordinary client's command that fetches the package into the current folder. */
  abstract String fetchCommand(String name, String version);

  static Registry of(String id) {
    for (Registry registry : values()) {
      if (registry.id.equals(id)) {
        return registry;
      }
    }
    throw new IllegalArgumentException("no registry " + id);
  }
}
