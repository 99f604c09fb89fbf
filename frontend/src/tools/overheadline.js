// @ts-check
/** Draws an overhead line, with its height at every point. */
import { drawing } from './drawing.js';

export const overheadLine = drawing({ name: 'overheadLines', kind: 'overheadLines', shape: 'path', label: 'overhead line', height: '6' });
