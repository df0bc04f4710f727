import { Link } from 'react-router-dom';

interface Props {
  /** Null on the list itself. */
  listHref: string | null;
  nextHref: string | null;
  nextLabel: string;
  /** Absent where there is nothing to leave out. */
  notExamined?: { isOn: boolean; onPress: () => void };
}

const cell =
  'grid min-h-16 place-items-center border-l border-rule px-2 text-center font-medium first:border-l-0';

/** What a thumb reaches: the list, leaving an item out, and the next. */
export function ExamineBar({ listHref, nextHref, nextLabel, notExamined }: Props) {
  return (
    <nav
      aria-label="Examination"
      className="no-print fixed inset-x-0 bottom-0 z-10 border-t border-ink bg-sheet pb-[env(safe-area-inset-bottom)]"
    >
      <div className="mx-auto grid max-w-2xl auto-cols-fr grid-flow-col">
        {listHref !== null && (
          <Link to={listHref} className={cell}>
            List
          </Link>
        )}
        {notExamined && (
          <button
            type="button"
            className={`${cell} ${notExamined.isOn ? 'bg-ink text-sheet' : ''}`}
            aria-pressed={notExamined.isOn}
            onClick={notExamined.onPress}
          >
            Not examined
          </button>
        )}
        {nextHref !== null && (
          <Link to={nextHref} className={`${cell} bg-copper text-on-copper`}>
            {nextLabel}
          </Link>
        )}
      </div>
    </nav>
  );
}
