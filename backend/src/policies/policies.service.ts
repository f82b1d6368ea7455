import { Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { agencyPolicies } from '@resistry/engineering/derating/agency-policies';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { Clock } from '../common/clock';
import { ClashProblem, MalformedProblem, NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { Writer } from '../database/writer';
import { type PolicyDto, PolicyVersionDto } from './dto/policy.dto';
import { PolicyEntryDto } from './dto/policy-entry.dto';
import type { ResolvedPolicy } from './policy-choice';

interface VersionRow {
  id: number;
  policy_id: number;
  name: string;
  origin: 'company' | 'agency';
  source: string;
  number: number;
  state: 'draft' | 'published';
  entries: string;
  note: string;
  published_at: string | null;
  published_by_name: string | null;
  in_force: number;
}

const versionsSql = `
  SELECT v.id, v.policy_id, p.name, p.origin, p.source, v.number, v.state, v.entries, v.note, v.published_at,
    u.name AS published_by_name, c.version_id IS NOT NULL AS in_force
  FROM derating_policy_versions v
  JOIN derating_policies p ON p.id = v.policy_id
  LEFT JOIN users u ON u.id = v.published_by
  LEFT JOIN company_policy c ON c.version_id = v.id`;

/** Derating policies: what is published, which is in force, and what a computation is made under. */
@Injectable()
export class PoliciesService implements OnApplicationBootstrap {
  constructor(
    private readonly readers: Readers,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  /** Loads the agencies' tables that come with the program, as read-only starting points, once each. */
  async onApplicationBootstrap(): Promise<void> {
    const known = await this.readers.select<{ name: string }>('SELECT name FROM derating_policies');
    const missing = agencyPolicies.filter(({ name }) => !known.some((policy) => policy.name === name));
    if (missing.length === 0) return;
    await this.writer.transaction(async (transaction) => {
      for (const { name, source, entries } of missing) {
        const policyId = await this.writer.insert(
          transaction,
          "INSERT INTO derating_policies (name, origin, source) VALUES ($name, 'agency', $source)",
          { name, source },
        );
        await this.writer.insert(
          transaction,
          `INSERT INTO derating_policy_versions (policy_id, number, state, entries, note, entered_at, published_at)
           VALUES ($policyId, 1, 'published', $entries, 'As printed', $at, $at)`,
          { policyId, entries: JSON.stringify(entries), at: this.clock.timestamp() },
        );
      }
    });
  }

  /** Every published version, the company's first, the newest first. */
  async list(): Promise<PolicyDto[]> {
    const rows = await this.readers.select<VersionRow>(
      `${versionsSql} WHERE v.state = 'published' ORDER BY p.origin DESC, p.name, v.number DESC`,
    );
    return rows.map((row) => ({
      id: row.id,
      name: row.name,
      version: row.number,
      origin: row.origin,
      source: row.source,
      inForce: row.in_force === 1,
      note: row.note,
      publishedAt: row.published_at ?? undefined,
      publishedBy: row.published_by_name ?? undefined,
    }));
  }

  /** One published version with its entries. */
  async find(id: number): Promise<PolicyVersionDto> {
    const versions = await this.list();
    const version = versions.find((candidate) => candidate.id === id);
    if (version === undefined)
      throw new NotFoundProblem(`There is no published policy version ${String(id)}.`);
    return Object.assign(new PolicyVersionDto(), version, { entries: await this.entriesOf(id) });
  }

  /** The policy a request asks for; without one, the company's version in force. */
  async resolve(choice: unknown): Promise<ResolvedPolicy> {
    if (choice === 'none') return { policy: 'none', used: 'none' };
    if (choice instanceof PolicyEntryDto) return { policy: { entries: [choice] }, used: 'inline' };
    if (choice !== undefined && !(typeof choice === 'number' && Number.isSafeInteger(choice) && choice > 0)) {
      throw new MalformedProblem([
        { pointer: '/policy', message: "must be the id of a published version, 'none', or one entry" },
      ]);
    }
    const where =
      choice === undefined ? 'WHERE c.version_id IS NOT NULL' : "WHERE v.id = $id AND v.state = 'published'";
    const row = await this.readers.lookUp<VersionRow>(
      `${versionsSql} ${where}`,
      choice === undefined ? {} : { id: choice },
    );
    if (row === undefined) {
      const detail =
        choice === undefined
          ? "The company has published no derating policy yet; choose a version, or 'none' for the manufacturer's ratings."
          : `There is no published policy version ${String(choice)}.`;
      throw new ClashProblem(detail, [{ pointer: '/policy', message: detail }]);
    }
    return {
      policy: { entries: JSON.parse(row.entries) as PolicyEntry[] },
      used: { id: row.id, version: row.number, name: row.name },
    };
  }

  private async entriesOf(id: number): Promise<PolicyEntry[]> {
    const row = await this.readers.lookUp<VersionRow>(`${versionsSql} WHERE v.id = $id`, { id });
    return JSON.parse(row?.entries ?? '[]') as PolicyEntry[];
  }
}
