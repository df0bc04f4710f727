import { section } from './build.ts';
import { shellBody } from './shell-body.ts';
import { shellJoints } from './shell-joints.ts';

export const shell = section('shell', 'Pressure shell', 6, { ...shellBody, ...shellJoints });
