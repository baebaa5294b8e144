import fc from "fast-check";

/** Every property draws the same cases in every run; another seed may be given to look further. */
fc.configureGlobal({ seed: Number(process.env["RINGFOLIO_SEED"] ?? 20261201) });
