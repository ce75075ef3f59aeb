declare module "virtual:licences" {
  /** Every package the product is made of; `text` is empty where the package ships none. */
  export const packages: readonly { name: string; version: string; licence: string; text: string }[];
}
