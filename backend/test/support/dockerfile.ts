/** One instruction of a Dockerfile, continued lines joined. */
export interface Instruction {
  name: string;
  rest: string;
}

export function readDockerfile(text: string): Instruction[] {
  return text
    .replaceAll(/^\s*#.*\n/gm, '')
    .replaceAll(/\\\n\s*/g, '')
    .split('\n')
    .filter((line) => line.trim() !== '')
    .map((line) => {
      const [name = '', ...rest] = line.trim().split(/\s+/);
      return { name, rest: rest.join(' ') };
    });
}

export interface Copy {
  /** The stage copied from; undefined for the tree itself. */
  from: string | undefined;
  sources: string[];
}

export function copiesOf(instructions: readonly Instruction[]): Copy[] {
  return instructions
    .filter(({ name }) => name === 'COPY')
    .map(({ rest }) => {
      const words = rest.split(' ');
      const option = words.find((word) => word.startsWith('--from='));
      return {
        from: option?.slice('--from='.length),
        sources: words.filter((word) => !word.startsWith('--')).slice(0, -1),
      };
    });
}

/** The variables that ENV sets. */
export function variablesOf(instructions: readonly Instruction[]): Record<string, string> {
  const pairs = instructions
    .filter(({ name }) => name === 'ENV')
    .flatMap(({ rest }) => rest.split(' '))
    .map((pair) => pair.split('='));
  return Object.fromEntries(pairs.map(([name = '', value = '']) => [name, value]));
}
