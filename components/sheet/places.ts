/** The pointer of a field by its name in the form: “gear.towBar.rating” is “/gear/towBar/rating”. */
export function pointerOf(name: string): string {
  return `/${name.replaceAll(".", "/")}`;
}

/** The name in the form of what a pointer into a sheet leads to. */
export function nameOf(pointer: string): string {
  return pointer.slice(1).replaceAll("/", ".");
}

/** The id of a field's control in the page. */
export function fieldId(name: string): string {
  return `field-${name.replaceAll(".", "-")}`;
}
