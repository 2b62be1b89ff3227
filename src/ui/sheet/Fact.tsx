/** One line of a card: what it is and what it comes to. */
export function Fact({ name, text }: { readonly name: string; readonly text: string }) {
  return (
    <>
      <dt>{name}</dt>
      <dd>{text}</dd>
    </>
  );
}
