import { isSoftJoint, jointOf } from '../engineering/joints.ts';
import type { JointMetalId } from '../engineering/joints.ts';
import { pressureText } from '../surveys/words.ts';

/** What is published of a joint’s metal, against a working pressure. */
export function jointSays({
  jointMetal,
  workingPa,
}: {
  jointMetal: JointMetalId;
  workingPa: number;
}): string {
  if (isSoftJoint(jointMetal))
    return 'Soft solder in a pressure joint is a stop: it softens not far above the heat of the steam, and creeps below it.';
  const { ratedPa } = jointOf(jointMetal);
  if (ratedPa === null)
    return 'Joints of this kind have no published rating here: the seam efficiency stands for them.';
  return workingPa > ratedPa
    ? `The published rating of brazed tube joints in saturated steam ends at ${pressureText(ratedPa)}: above it there is no figure here.`
    : `Brazed joints are rated to ${pressureText(ratedPa)} in saturated steam by a published table.`;
}
