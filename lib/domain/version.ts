/** This product's name and version as an `open` entry's `app` says it. A test holds it to package.json. */
export const APP = "hookfast 0.1.0";
