import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse } from 'yaml';
import { readEnvironment, REPOSITORY_ROOT } from '../src/config/environment';
import { copiesOf, readDockerfile, variablesOf } from './support/dockerfile';

interface Service {
  build?: string;
  image: string;
  command?: string[];
  ports?: string[];
  environment: Record<string, string>;
  volumes: string[];
  depends_on?: string[];
  healthcheck?: { disable: boolean };
}

interface Manifest {
  workspaces?: string[];
  scripts: Record<string, string>;
  engines?: { node: string };
}

const read = (path: string): string => readFileSync(join(REPOSITORY_ROOT, path), 'utf8');
const manifest = JSON.parse(read('package.json')) as Manifest;
const compose = parse(read('docker-compose.yml')) as {
  services: Record<string, Service>;
  volumes: Record<string, unknown>;
};
const services = Object.entries(compose.services);
const instructions = readDockerfile(read('Dockerfile'));
const imageVariables = variablesOf(instructions);
const lastOf = (name: string): string | undefined =>
  instructions.filter((instruction) => instruction.name === name).at(-1)?.rest;

/** The variables that the code reads, by the one function through which it asks. */
const KNOWN = [...read('backend/src/config/environment.ts').matchAll(/given\('(\w+)'\)/g)].map(
  ([, name]) => name,
);

/** The defaults that stand in a compose file, as they are taken where nobody sets anything. */
const withDefaults = (variables: Record<string, string>): Record<string, string> =>
  Object.fromEntries(
    Object.entries(variables).map(([name, value]) => [name, value.replace(/^\$\{\w+:-(.*)\}$/, '$1')]),
  );

/** The source of a built file. */
const sourceOf = (built: string): string =>
  built.replace(/^(backend(?:\/engineering)?)\/dist\/(.*)\.js$/, '$1/src/$2.ts');

const environmentOf = (service: Service) =>
  readEnvironment({ ...imageVariables, ...withDefaults(service.environment) });

describe('the image', () => {
  it('copies only what is in the tree, or what a stage before it builds from the tree', () => {
    const copies = copiesOf(instructions);
    expect(copies.length).toBeGreaterThan(5);
    for (const { from, sources } of copies) {
      for (const source of sources) {
        const inTree = source.replace(/^\/resistry\/?/, '').replace(/\/dist$/, '/package.json');
        expect([source, existsSync(join(REPOSITORY_ROOT, from === undefined ? source : inTree))]).toEqual([
          source,
          true,
        ]);
      }
    }
  });

  it('copies the manifest of every workspace before it installs, and installs only workspaces there are', () => {
    const workspaces = manifest.workspaces ?? [];
    const copied = copiesOf(instructions).flatMap(({ sources }) => sources);
    expect(copied).toEqual(
      expect.arrayContaining(workspaces.map((workspace) => `${workspace}/package.json`)),
    );
    const installed = [...read('Dockerfile').matchAll(/--workspace (\S+)/g)].map(
      ([, workspace]) => workspace,
    );
    expect(installed.length).toBeGreaterThan(0);
    expect(workspaces).toEqual(expect.arrayContaining(installed));
  });

  it('builds by a script there is, on a Node that is new enough', () => {
    const scripts = [...read('Dockerfile').matchAll(/npm run (\S+)/g)].map(([, script]) => script);
    expect(scripts).toEqual(['build']);
    expect(Object.keys(manifest.scripts)).toContain('build');
    const major = Number(/^>=(\d+)/.exec(manifest.engines?.node ?? '')?.[1]);
    const images = instructions.filter(({ name, rest }) => name === 'FROM' && rest.startsWith('node:'));
    for (const { rest } of images) expect(rest).toMatch(new RegExp(`^node:${major}-\\w+-slim`));
    expect(images).toHaveLength(2);
  });

  it('installs with the settings of npm and of the SQLite binding in place', () => {
    const first = instructions.findIndex(({ name, rest }) => name === 'RUN' && rest.startsWith('npm ci'));
    const copied = copiesOf(instructions.slice(0, first)).flatMap(({ sources }) => sources);
    expect(copied).toEqual(expect.arrayContaining(['.npmrc', '.prebuild-installrc', 'package-lock.json']));
  });

  it('leaves nothing that it copies out of what is sent to be built', () => {
    const left = read('.dockerignore')
      .split('\n')
      .filter((line) => line !== '' && !line.includes('*'));
    const copied = copiesOf(instructions).flatMap(({ from, sources }) => (from === undefined ? sources : []));
    for (const path of copied) expect(left).not.toContain(path);
  });

  it('runs what is built, as nobody special, at the port that it names', () => {
    const command = JSON.parse(lastOf('CMD') ?? '[]') as string[];
    expect(command[0]).toBe('node');
    expect(existsSync(join(REPOSITORY_ROOT, sourceOf(command[1] ?? '')))).toBe(true);
    expect(lastOf('USER')).toBe('node');
    const environment = readEnvironment(imageVariables);
    expect(lastOf('EXPOSE')).toBe(String(environment.port));
    expect(lastOf('VOLUME')).toBe(environment.dataDirectory);
    expect(environment.host).toBe('0.0.0.0');
  });

  it('asks an address that anybody may ask whether it is well', () => {
    const [, path = ''] = /(\/api\/[\w/]+)/.exec(lastOf('HEALTHCHECK') ?? '') ?? [];
    const { paths } = JSON.parse(read('backend/openapi.json')) as { paths: Record<string, object> };
    expect(Object.keys(paths)).toContain(path);
  });
});

describe('the services', () => {
  it('are the application and the mail catcher, of one image that is built here', () => {
    expect(services.map(([name]) => name)).toEqual(['application', 'mail']);
    for (const [, { build, image }] of services)
      expect({ build, image }).toEqual({ build: '.', image: 'resistry' });
  });

  it.each(services)(
    '%s sets only variables that the code reads, to values that it takes',
    (_name, service) => {
      expect(KNOWN).toEqual(expect.arrayContaining(Object.keys(service.environment)));
      expect(() => environmentOf(service)).not.toThrow();
    },
  );

  it.each(services)(
    '%s runs a command that is built, with its data on declared volumes',
    (_name, service) => {
      const [program, file] = service.command ?? (JSON.parse(lastOf('CMD') ?? '[]') as string[]);
      expect(program).toBe('node');
      expect(existsSync(join(REPOSITORY_ROOT, sourceOf(file ?? '')))).toBe(true);
      const mounts = service.volumes.map((volume) => volume.split(':'));
      const environment = environmentOf(service);
      for (const [name = '', path = ''] of mounts) {
        expect(Object.keys(compose.volumes)).toContain(name);
        expect([environment.dataDirectory, environment.folder('mail')]).toContain(path);
      }
      expect(mounts.map(([, path]) => path)).toContain(environment.folder('mail'));
    },
  );

  it('publish the application alone, on this machine, at the port that its links name', () => {
    const { application, mail } = compose.services;
    const environment = environmentOf(application!);
    expect(application?.ports).toEqual([`127.0.0.1:${new URL(environment.appUrl).port}:${environment.port}`]);
    expect(mail?.ports).toBeUndefined();
  });

  it('send mail from the one to the other', () => {
    const { application, mail } = compose.services;
    const address = new URL(environmentOf(application!).mailUrl ?? '');
    expect(address.protocol).toBe('smtp:');
    expect(application?.depends_on).toEqual([address.hostname]);
    expect(Object.keys(compose.services)).toContain(address.hostname);
    expect(Number(address.port)).toBe(environmentOf(mail!).port);
    expect(mail?.healthcheck).toEqual({ disable: true });
  });

  it('keep the database from the mail catcher', () => {
    const { mail } = compose.services;
    expect(mail?.volumes.map((volume) => volume.split(':')[0])).toEqual(['mail']);
  });
});
