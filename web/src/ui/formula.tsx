import { Fragment } from 'react';

// What stands low and what stands high in a formula written as a line: `h_fg`, `x^0.75`, `r^(2 / k)`.
const marks = /_([A-Za-z0-9]+)|\^(\d+(?:\.\d+)?|[A-Za-z]|\((?:[^()]|\([^()]*\))*\))/g;

/** A formula or a symbol, with its subscripts and powers set as such. */
export function Formula({ text }: { text: string }) {
  const parts = [];
  let from = 0;
  for (const match of text.matchAll(marks)) {
    const [whole, low, high] = match;
    parts.push(
      <Fragment key={match.index}>
        {text.slice(from, match.index)}
        {low === undefined ? <sup>{high}</sup> : <sub>{low}</sub>}
      </Fragment>,
    );
    from = match.index + whole.length;
  }
  return (
    <>
      {parts}
      {text.slice(from)}
    </>
  );
}
