package plateledger.validation;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.extension.ExtendWith;

/**
 * Marks a test method whose expected values come from a published or independent source: one line of the validation document.
 * What the method asserts through {@link Recorded} is counted into that line.
 */
@Target(ElementType.METHOD)
@Retention(RetentionPolicy.RUNTIME)
@Tag("validation")
@ExtendWith(PublishedExtension.class)
public @interface Published {
    /** Heading under which the line stands, e.g. {@code Theory}. */
    String section();

    /** What is checked, unique within the section. */
    String what();

    /** Where the expected values come from. */
    String source();
}
