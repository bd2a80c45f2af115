/** The choices of a select, in the order of the labels, from a table of code → label. */
export const optionsOf = <Code extends string>(
  labels: Readonly<Record<Code, string>>,
): readonly { readonly value: Code; readonly label: string }[] =>
  (Object.entries(labels) as [Code, string][]).map(([value, label]) => ({
    value,
    label: label.charAt(0).toUpperCase() + label.slice(1),
  }));
