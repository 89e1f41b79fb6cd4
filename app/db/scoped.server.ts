/**
 * The only way to a tenant's rows. Every query made here carries the organisation; the models themselves are
 * imported nowhere else but in `unscoped.server.ts`, which a test enforces.
 */
import type {
  Attributes,
  CreationAttributes,
  FindOptions,
  Model,
  ModelStatic,
  Order,
  Transaction,
  WhereOptions,
} from "sequelize";
import { inWriteTransaction } from "./connection.server";
import { newId } from "./id.server";
import { Cast } from "./models/cast.server";
import { Estimate } from "./models/estimate.server";
import { FlagOverride } from "./models/flag-override.server";
import { Invitation } from "./models/invitation.server";
import { Membership } from "./models/membership.server";
import { MemoEstimate } from "./models/memo-estimate.server";
import { MemoRevision } from "./models/memo-revision.server";
import { Memo } from "./models/memo.server";
import { MethodSheet } from "./models/method-sheet.server";
import { Project } from "./models/project.server";
import { StormRecord } from "./models/record.server";
import { ResultSeries } from "./models/result-series.server";
import { Result } from "./models/result.server";
import { Series } from "./models/series.server";
import { ShareLink } from "./models/share-link.server";
import { ShareVisit } from "./models/share-visit.server";
import { SourceFile } from "./models/source-file.server";
import { Storm } from "./models/storm.server";
import { StudyBox } from "./models/study-box.server";
import { ThresholdSheet } from "./models/threshold-sheet.server";
import { WaterColumn } from "./models/water-column.server";

interface TenantRow {
  id: string;
  organisationId: string;
}
type Values<M extends Model> = Omit<CreationAttributes<M>, "id" | "organisationId">;
/** Equal to a value, or to one of several. */
type Filter<M extends Model> = {
  [Key in Exclude<keyof Attributes<M>, "organisationId">]?: Attributes<M>[Key] | readonly Attributes<M>[Key][];
};

interface ListOptions<M extends Model> {
  where?: Filter<M>;
  order?: Order;
  /** Columns that stay behind: blobs that the caller has no use for. */
  without?: (keyof Attributes<M> & string)[];
  limit?: number;
  offset?: number;
}

export class TenantTable<M extends Model> {
  constructor(
    private readonly model: ModelStatic<M>,
    private readonly organisationId: string,
    private readonly transaction: Transaction | undefined,
  ) {}

  private scope(where: object = {}): WhereOptions<Attributes<M>> {
    // Last, so that nothing in `where` can name another organisation.
    return { ...where, organisationId: this.organisationId } as unknown as WhereOptions<Attributes<M>>;
  }

  private options(list: ListOptions<M>): FindOptions<Attributes<M>> {
    const { where, order, without, limit, offset } = list;
    return {
      where: this.scope(where),
      order,
      limit,
      offset,
      attributes: without && { exclude: without },
      transaction: this.transaction,
    };
  }

  async find(id: string, list: Pick<ListOptions<M>, "where" | "without"> = {}): Promise<M | null> {
    return this.model.findOne(this.options({ ...list, where: { ...list.where, id } as unknown as Filter<M> }));
  }

  async first(list: ListOptions<M>): Promise<M | null> {
    return this.model.findOne(this.options(list));
  }

  async list(list: ListOptions<M> = {}): Promise<M[]> {
    return this.model.findAll(this.options(list));
  }

  async count(where?: Filter<M>): Promise<number> {
    return this.model.count({ where: this.scope(where), transaction: this.transaction });
  }

  async max(column: keyof Attributes<M> & string, where?: Filter<M>): Promise<number> {
    const highest = await this.model.max<number | null, M>(column, {
      where: this.scope(where),
      transaction: this.transaction,
    });
    return highest ?? 0;
  }

  async create(values: Values<M>): Promise<M> {
    const row = { ...values, id: newId(), organisationId: this.organisationId } as unknown as CreationAttributes<M>;
    return this.model.create(row as M["_creationAttributes"], { transaction: this.transaction });
  }

  /** Many rows at once; rows of one call share their time of creation. */
  async createAll(rows: readonly Values<M>[]): Promise<void> {
    const whole = rows.map(
      (values) => ({ ...values, id: newId(), organisationId: this.organisationId }) as unknown as CreationAttributes<M>,
    );
    await this.model.bulkCreate(whole, { transaction: this.transaction, validate: true });
  }

  /** False where this organisation has no such row. */
  async update(id: string, values: Partial<Values<M>>): Promise<boolean> {
    const changes: Partial<TenantRow> & Record<string, unknown> = { ...values };
    delete changes.id;
    delete changes.organisationId;
    const [count] = await this.model.update(changes as unknown as Partial<Attributes<M>>, {
      where: this.scope({ id }),
      transaction: this.transaction,
    });
    return count > 0;
  }

  async remove(where: Filter<M>): Promise<number> {
    return this.model.destroy({ where: this.scope(where), transaction: this.transaction });
  }
}

export interface Tenant {
  readonly organisationId: string;
  /** The writing transaction under way, for what is written beside the tenant's own rows. */
  readonly transaction: Transaction | undefined;
  readonly memberships: TenantTable<Membership>;
  readonly invitations: TenantTable<Invitation>;
  readonly projects: TenantTable<Project>;
  readonly studyBoxes: TenantTable<StudyBox>;
  readonly storms: TenantTable<Storm>;
  readonly sourceFiles: TenantTable<SourceFile>;
  readonly records: TenantTable<StormRecord>;
  readonly series: TenantTable<Series>;
  readonly thresholdSheets: TenantTable<ThresholdSheet>;
  readonly flagOverrides: TenantTable<FlagOverride>;
  readonly waterColumns: TenantTable<WaterColumn>;
  readonly casts: TenantTable<Cast>;
  readonly methodSheets: TenantTable<MethodSheet>;
  readonly estimates: TenantTable<Estimate>;
  readonly results: TenantTable<Result>;
  readonly resultSeries: TenantTable<ResultSeries>;
  readonly memos: TenantTable<Memo>;
  readonly memoEstimates: TenantTable<MemoEstimate>;
  readonly memoRevisions: TenantTable<MemoRevision>;
  readonly shareLinks: TenantTable<ShareLink>;
  readonly shareVisits: TenantTable<ShareVisit>;
  /** All or nothing: the same tables inside one writing transaction, the one under way where there is one. */
  write<T>(work: (tenant: Tenant) => Promise<T>): Promise<T>;
}

export function forOrganisation(organisationId: string, transaction?: Transaction): Tenant {
  const inside = (own: Transaction) => forOrganisation(organisationId, own);
  const table = <M extends Model>(model: ModelStatic<M>) => new TenantTable(model, organisationId, transaction);
  return {
    organisationId,
    transaction,
    memberships: table(Membership),
    invitations: table(Invitation),
    projects: table(Project),
    studyBoxes: table(StudyBox),
    storms: table(Storm),
    sourceFiles: table(SourceFile),
    records: table(StormRecord),
    series: table(Series),
    thresholdSheets: table(ThresholdSheet),
    flagOverrides: table(FlagOverride),
    waterColumns: table(WaterColumn),
    casts: table(Cast),
    methodSheets: table(MethodSheet),
    estimates: table(Estimate),
    results: table(Result),
    resultSeries: table(ResultSeries),
    memos: table(Memo),
    memoEstimates: table(MemoEstimate),
    memoRevisions: table(MemoRevision),
    shareLinks: table(ShareLink),
    shareVisits: table(ShareVisit),
    write: (work) => (transaction ? work(inside(transaction)) : inWriteTransaction((own) => work(inside(own)))),
  };
}
