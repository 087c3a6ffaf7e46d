/** A step of what PostgreSQL does for a statement, as EXPLAIN tells it in JSON. */
export interface PlanNode {
  'Node Type': string;
  'Relation Name'?: string;
  'Index Name'?: string;
  'Actual Rows': number;
  Plans?: PlanNode[];
}

/** A step with all below it. */
export const nodesOf = (node: PlanNode): PlanNode[] => [node, ...(node.Plans ?? []).flatMap(nodesOf)];
