package plateledger.validation;

import org.junit.jupiter.api.extension.AfterTestExecutionCallback;
import org.junit.jupiter.api.extension.BeforeTestExecutionCallback;
import org.junit.jupiter.api.extension.ExtensionContext;

/** Opens the record of a {@link Published} test before it runs and writes it when it has passed. */
final class PublishedExtension implements BeforeTestExecutionCallback, AfterTestExecutionCallback {
    @Override
    public void beforeTestExecution(ExtensionContext context) {
        Published published = context.getRequiredTestMethod().getAnnotation(Published.class);
        if (published == null) {
            throw new IllegalStateException("no line is named by " + context.getDisplayName());
        }
        Recorded.open(ValidationRecorder.of(
                context.getRequiredTestClass(), published.section(), published.what(), published.source()));
    }

    @Override
    public void afterTestExecution(ExtensionContext context) {
        ValidationRecorder recorder = Recorded.close();
        if (context.getExecutionException().isEmpty()) {
            recorder.close();
        }
    }
}
