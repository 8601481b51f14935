import { z } from 'zod';

// Words for faults whose schema says nothing better. A schema's own message always wins.
z.config({
  customError: (issue) => {
    if (issue.code === 'invalid_type') return issue.input === undefined || issue.input === null ? 'This is needed.' : 'This is not of the right kind.';
    if (issue.code === 'too_small') return issue.origin === 'string' ? 'This is needed.' : `At least ${issue.minimum}.`;
    if (issue.code === 'too_big') return issue.origin === 'string' ? `${issue.maximum} letters at most.` : `At most ${issue.maximum}.`;
    if (issue.code === 'invalid_value') return 'Pick one from the list.';
    if (issue.code === 'unrecognized_keys') return `Nothing here is called ${issue.keys.join(', ')}.`;
    return undefined;
  },
});
