import type { Grade } from '#shared/surveys/record.ts';

const ranks: Record<Grade, number> = {
  notFitted: 0,
  notExamined: 0,
  sound: 1,
  serviceable: 2,
  attention: 3,
  unfit: 4,
};

/** How bad a grade is: 0 for no grade, then 1 (Sound) to 4 (Unfit). */
export const gradeRank = (grade: Grade): number => ranks[grade];
