package binspan.merit;

/** Key length by one bound at one uptime, with what is needed to follow it to other uptimes. */
sealed interface GrowingKey permits TomamichelKey, LimKey {
    /** Key length, bits, not rounded; 0 or less means no key. */
    double bits();

    /** Derivative of the key length with respect to the logarithm of the uptime, bits. */
    double growth();

    /** The same link after an uptime longer by a factor. */
    GrowingKey times(double factor);
}
