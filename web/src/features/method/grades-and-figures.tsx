import type { MethodData } from '#shared/surveys/method.ts';
import { grade as gradeId } from '#shared/surveys/record.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { Table } from '#web/ui/table.tsx';

const gradeCell = ({ id, label }: { id: string; label: string }) => {
  const known = gradeId.safeParse(id);
  return known.success ? <GradeMark grade={known.data} hasLabel /> : label;
};

/** What each grade is worth, and how the figures are worked out from them. */
export function GradesAndFigures({ method }: { method: MethodData }) {
  return (
    <div className="grid gap-8 lg:grid-cols-[minmax(0,4fr)_minmax(0,7fr)]">
      <Table
        caption="Grades"
        isCaptionHidden
        rows={method.grades}
        keyOf={({ id }) => id}
        columns={[
          { head: 'Grade', cell: gradeCell },
          { head: 'Points', isNumber: true, cell: ({ points }) => points ?? '–' },
        ]}
      />
      <ul className="grid max-w-prose list-disc content-start gap-2 pl-5">
        {method.arithmetic.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </div>
  );
}
