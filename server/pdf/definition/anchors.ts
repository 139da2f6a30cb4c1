/** Names of places in the file that pages are counted for and links lead to. */
export const calculationAnchor = (id: string): string => `calculation ${id}`
export const workingAnchor = (id: string): string => `working ${id}`
export const sectionAnchor = (key: string): string => `section ${key}`
export const headingAnchor = (id: string): string => `heading ${id}`
