/** A package of others that the product is made of; `text` is empty where it ships no licence text. */
export interface LicensedPackage {
  name: string;
  version: string;
  licence: string;
  text: string;
}

/** All of them, by name. Filled by `licences-plugin.ts` when the page is built or served. */
export const packages: readonly LicensedPackage[] = [];
