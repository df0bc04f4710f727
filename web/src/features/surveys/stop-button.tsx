import { useRef } from 'react';
import type { FiringId } from '#shared/boilers/boiler.ts';
import { Button } from '#web/ui/button.tsx';

const fireOut: Partial<Record<FiringId, string>> = {
  coal: 'Drop the fire, or smother it with dry ash or sand. No water on it.',
  gas: 'Shut the gas at the container.',
  spirit: 'Draw the lamp out and smother it.',
  oil: 'Shut the oil.',
  electric: 'Switch it off at the wall.',
};

/** One press in trouble: what to do, in the order to do it. */
export function StopButton({ firing }: { firing: FiringId }) {
  const dialog = useRef<HTMLDialogElement>(null);
  return (
    <>
      <button
        type="button"
        className="min-h-16 w-full rounded border-2 border-unfit bg-transparent text-xl font-bold text-unfit"
        onClick={() => dialog.current?.showModal()}
      >
        Stop
      </button>
      <dialog
        ref={dialog}
        aria-labelledby="stop-title"
        className="m-auto w-[min(34rem,calc(100vw-2rem))] border-2 border-unfit bg-sheet p-5 text-ink"
      >
        <h2 id="stop-title" className="mb-3 text-unfit">
          Stop the test
        </h2>
        <ol className="grid list-decimal gap-3 pl-6 text-lg leading-7">
          <li>{fireOut[firing] ?? 'Put the fire out.'}</li>
          <li>Stand to one side, out of line with fittings and glass. Send everybody back.</li>
          <li>
            Let the safety valve blow. If pressure still climbs, open the blower or stop valve to the open air
            from behind cover, or leave it and go.
          </li>
          <li>
            If the water has left the glass, put no feed in: cold water on hot metal bursts boilers. Let it
            cool.
          </li>
          <li>If the carbon monoxide alarm sounded, everybody out into the air, and stay out.</li>
          <li>Write down what happened when it is cold.</li>
        </ol>
        <div className="mt-5">
          <Button isWide onClick={() => dialog.current?.close()}>
            Done
          </Button>
        </div>
      </dialog>
    </>
  );
}
