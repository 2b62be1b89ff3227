import { Fragment } from 'react';
import { MathName } from '../figures/index.ts';

/** Names one after the other, a dash where there are none. */
export function NameList({ names }: { readonly names: readonly string[] }) {
  if (names.length === 0) return <>–</>;
  return (
    <>
      {names.map((name, k) => (
        <Fragment key={name}>
          {k > 0 && ', '}
          <MathName name={name} />
        </Fragment>
      ))}
    </>
  );
}
