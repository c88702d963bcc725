import fc from 'fast-check';

/**
 * Properties are tried with the same values in every run, so that a change is red because of the change. Other values:
 * `PROPERTY_SEED=… npx vitest run …`; a counterexample found that way becomes an example of its own.
 */
fc.configureGlobal({ seed: Number(process.env['PROPERTY_SEED'] ?? 20_261_201) });
