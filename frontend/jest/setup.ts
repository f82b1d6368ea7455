import '@testing-library/jest-dom';
import { configure } from '@testing-library/react';

// A busy machine takes its time over the first load of a page; a test that passes is none the slower for it.
configure({ asyncUtilTimeout: 10_000 });
