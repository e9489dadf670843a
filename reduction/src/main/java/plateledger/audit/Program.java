package plateledger.audit;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URISyntaxException;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.CodeSource;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Properties;
import java.util.stream.Stream;

/**
 * Which program made a result.
 *
 * @param version version, e.g. {@code 0.1.0}
 * @param build SHA-256 over the names and bytes of the reduction's own classes and resources, libraries, desktop and demo
 *     not included: two builds with the same value compute the same
 */
public record Program(String version, String build) {
    private static final List<String> NOT_REDUCTION = List.of("plateledger/gui/", "plateledger/demo/");

    /** This running program. */
    public static Program running() {
        return new Program(versionOnly(), digestOfOwnClasses());
    }

    /** The version alone, without reading the program's own files. */
    public static String versionOnly() {
        Properties properties = new Properties();
        try (InputStream in = Program.class.getResourceAsStream("build.properties")) {
            if (in == null) {
                throw new IllegalStateException("resource build.properties is missing from the program");
            }
            properties.load(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return properties.getProperty("version", "");
    }

    private static String digestOfOwnClasses() {
        CodeSource source = Program.class.getProtectionDomain().getCodeSource();
        if (source == null) {
            throw new IllegalStateException("the program does not know where its own classes lie");
        }
        try {
            Path place = Path.of(source.getLocation().toURI());
            if (Files.isDirectory(place)) {
                return digest(place);
            }
            try (FileSystem jar = FileSystems.newFileSystem(place)) {
                return digest(jar.getPath("/"));
            }
        } catch (URISyntaxException e) {
            throw new IllegalStateException("place of the program is no path: " + source.getLocation(), e);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String digest(Path root) throws IOException {
        MessageDigest digest = Digests.sha256();
        List<Path> files;
        try (Stream<Path> all = Files.walk(root.resolve("plateledger"))) {
            files = all.filter(Files::isRegularFile).toList();
        }
        List<String> names = files.stream()
                .map(file -> root.relativize(file).toString().replace('\\', '/'))
                .filter(name -> NOT_REDUCTION.stream().noneMatch(name::startsWith))
                .sorted()
                .toList();
        for (String name : names) {
            digest.update(name.getBytes(java.nio.charset.StandardCharsets.UTF_8));
            digest.update((byte) 0);
            digest.update(Files.readAllBytes(root.resolve(name)));
        }
        return HexFormat.of().formatHex(digest.digest());
    }
}
