import { string } from 'yup';

/** As the server takes it. */
const longestReason = 1000;

/** Why something was changed; asked for at every change of state. */
export const reasonRule = string()
  .trim()
  .required('Say why; it stands in the history.')
  .max(longestReason, `At most ${longestReason} characters.`);
