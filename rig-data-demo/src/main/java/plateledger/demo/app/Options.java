package plateledger.demo.app;

/**
 * What kind of campaign is simulated.
 *
 * @param productOnly only the product's day
 * @param bend bend of the product's law in ln Nu over the speed range, 0 for a straight law
 * @param errors whether instruments, rig and noise err
 */
public record Options(boolean productOnly, double bend, Errors errors) {
    /** Whether anything errs. */
    public enum Errors {
        /** All as declared, no noise. */
        NONE,
        /** All drawn from what is declared. */
        DRAWN
    }

    /** The full campaign with drawn errors. */
    public static Options full() {
        return new Options(false, 0.0, Errors.DRAWN);
    }

    /** The product's day with drawn errors. */
    public static Options product() {
        return new Options(true, 0.0, Errors.DRAWN);
    }

    /** The same with a bent law. */
    public Options bent(double by) {
        return new Options(productOnly, by, errors);
    }

    /** The same without any error. */
    public Options withoutErrors() {
        return new Options(productOnly, bend, Errors.NONE);
    }
}
