import { Button } from '#web/ui/button.tsx';
import { WordsInput } from './words-input.tsx';

interface Props {
  label: string;
  onStart: () => void;
  reason: string;
  onReason: (reason: string) => void;
}

/** A test that is not recorded yet: begin it, or say why there was none. */
export function TestOrReason({ label, onStart, reason, onReason }: Props) {
  return (
    <>
      <Button isWide onClick={onStart}>
        {label}
      </Button>
      <WordsInput label="Or say why there was none" most={400} rows={2} value={reason} onChange={onReason} />
    </>
  );
}
