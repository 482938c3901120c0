// Texts and links: nothing here needs a script.
export const csr = false;
