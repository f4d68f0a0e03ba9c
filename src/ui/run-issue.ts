import type { z } from 'zod';

/** What is wrong with a field, in a sentence. */
export function sayIssue(issue: z.core.$ZodIssue): string {
  if (issue.code === 'too_small') return `Must be ${issue.inclusive ? 'at least' : 'above'} ${issue.minimum}.`;
  if (issue.code === 'too_big') return `Must be ${issue.inclusive ? 'at most' : 'below'} ${issue.maximum}.`;
  if (issue.code === 'invalid_type') return 'Give a number.';
  if (issue.code === 'invalid_union') return sayUnion(issue);
  return issue.code === 'custom' ? sentence(issue.message) : 'This value is not understood.';
}

/** The alternative whose kind fitted says more than "one of these". */
function sayUnion(issue: z.core.$ZodIssueInvalidUnion): string {
  const nearest = issue.errors.flat().find(({ code }) => code === 'too_small' || code === 'too_big');
  return nearest ? sayIssue(nearest) : 'This value is not understood.';
}

const sentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
