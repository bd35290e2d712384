package binspan.merit;

/** Published lower bounds of the secret key length of a finite block; both hold at the stated failure probabilities, so the longer counts. */
public enum FiniteKeyBound {
    /**
     * Tomamichel, Lim, Gisin, Renner, Nat. Commun. 3, 634 (2012), arXiv:1103.4130 (formula from memory): n(1 - h(Q + mu)) - leak -
     * log2(2/(eps_sec^2 eps_cor)), mu = sqrt((n + k)/(n k) (k + 1)/k ln(4/eps_sec)).
     */
    TOMAMICHEL_2012 {
        @Override
        GrowingKey key(BlockTerms terms) {
            return TomamichelKey.of(terms);
        }
    },

    /**
     * Lim, Xu, Pan, Ekert, Phys. Rev. Lett. 126, 100501 (2021), arXiv:2009.04882 (bound from memory; it gives the published 6 bits for a block of
     * 3100 at 4.51 % and 1e-6): eps = 2 eps_pe + eps_pa, eps_pe^2 = min over xi of exp(-2 m k xi^2/(n + 1)) + exp(-2 G ((n(nu - xi))^2 - 1)), G =
     * 1/(m(d + xi) + 1) + 1/(m - m(d + xi) + 1), eps_pa = sqrt(2^-(n(1 - h(d + nu)) - leak - log2(1/eps_cor) - l))/2; the best nu is searched.
     */
    LIM_2021 {
        @Override
        GrowingKey key(BlockTerms terms) {
            return LimKey.of(terms);
        }
    };

    /** Length of the secret key in bits, not rounded; 0 or less means no key. */
    public double bits(FiniteKeyBlock block) {
        return key(BlockTerms.of(block)).bits();
    }

    /** The longer of all bounds, bits. */
    static double longest(BlockTerms terms) {
        return Math.max(TOMAMICHEL_2012.key(terms).bits(), LIM_2021.key(terms).bits());
    }

    abstract GrowingKey key(BlockTerms terms);
}
