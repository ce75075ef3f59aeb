/** The form in which two addresses are compared: neither case nor compatibility forms of letters tell them apart. */
export function normaliseEmail(email: string): string {
  return email.trim().normalize("NFKC").toLowerCase();
}
