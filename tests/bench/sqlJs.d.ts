// What the bench uses of sql.js, which brings no types.
declare module "sql.js" {
  export interface Statement {
    get(parameters: readonly (string | number)[]): (string | number | null)[];
    run(parameters: readonly (string | number)[]): void;
  }
  export interface Database {
    exec(sql: string): void;
    prepare(sql: string): Statement;
  }
  export default function initSqlJs(): Promise<{ Database: new () => Database }>;
}
