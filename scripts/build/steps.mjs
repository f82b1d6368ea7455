import { inRepository, TOOLS } from '../repository.mjs';
import { compressPages } from './compress-pages.mjs';

const paths = (...names) => names.map((name) => inRepository(name));

const EVERYWHERE = paths('package-lock.json', 'tsconfig.base.json', 'scripts/build');
const ENGINEERING = paths(
  'backend/engineering/src',
  'backend/engineering/package.json',
  'backend/engineering/tsconfig.json',
  'backend/engineering/tsconfig.build.json',
);
const BACKEND = paths(
  'backend/src',
  'backend/package.json',
  'backend/tsconfig.json',
  'backend/tsconfig.build.json',
);
const FRONTEND = paths(
  'frontend/src',
  'frontend/public',
  'frontend/index.html',
  'frontend/package.json',
  'frontend/tsconfig.json',
  'frontend/vite.config.mjs',
);

/**
 * What is built, in order: each with the files it is made from and one file that is there when it was made. The browser
 * takes the engineering core as source, so its step has that among its inputs and not its build. `finish` is what is left
 * to do when the tool has ended well.
 */
export const STEPS = [
  {
    name: 'engineering',
    words: [TOOLS.typescript, '-p', 'tsconfig.build.json'],
    cwd: inRepository('backend/engineering'),
    inputs: [...EVERYWHERE, ...ENGINEERING],
    result: inRepository('backend/engineering/dist'),
  },
  {
    name: 'backend',
    words: [TOOLS.typescript, '-p', 'tsconfig.build.json'],
    cwd: inRepository('backend'),
    inputs: [...EVERYWHERE, ...ENGINEERING, ...BACKEND],
    result: inRepository('backend/dist/main.js'),
  },
  {
    name: 'frontend',
    words: [TOOLS.vite, 'build', '--logLevel', 'warn'],
    cwd: inRepository('frontend'),
    inputs: [...EVERYWHERE, ...ENGINEERING, ...FRONTEND],
    result: inRepository('frontend/dist/index.html'),
    finish: () => compressPages(inRepository('frontend/dist')),
  },
];
