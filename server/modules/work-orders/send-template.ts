import type { RouteContext } from '#server/http/define-route.ts';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { TemplateDesign, TemplateInput } from '#server/workbook/template-types.ts';
import { writeTemplate } from '#server/workbook/write-template.ts';
import type { Kind } from '#shared/records/types.ts';

const TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
type Order = {
  number: string;
  title: string;
  zone: string;
  contractor: string;
  owner: string | null;
  standard: number | null;
};

/**
 * Streams the workbook template of a work order, filled with its design list.
 * @throws Problem 404 for another contractor's order as for none
 */
export async function sendTemplate(ctx: RouteContext): Promise<void> {
  const { em, params, ability, res } = ctx;
  const order = await row<Order>(
    em,
    `select w.number, w.title, w.zone, o.name as contractor,
       (select name from organisations where kind = 'owner' order by created_at, id limit 1) as owner,
       (select n from standard_versions where state = 'published' and effective_on <= current_date
        order by effective_on desc limit 1) as standard
     from work_orders w join organisations o on o.id = w.contractor_id
     where w.id = $1 and ($2::uuid is null or w.contractor_id = $2)`,
    [params.id, contractorWall(ability, 'read', 'WorkOrder')],
  );
  if (!order) throw notFound();
  const input = await templateInput(ctx, order);
  res.type(TYPE).attachment(`${order.number} template.xlsx`).type(TYPE);
  await writeTemplate(res, input);
}

async function templateInput({ em, params }: RouteContext, order: Order): Promise<TemplateInput> {
  const planned = await rows<{ structure_number: string; kind: Kind; design: Partial<TemplateDesign> }>(
    em,
    `select structure_number, kind, design from planned_current
     where work_order_id = $1 and not removed order by structure_number, kind`,
    [params.id],
  );
  const products = await rows<{ code: string; kitsFt3: number[] }>(
    em,
    `select distinct on (p.code) p.code, v.body -> 'kitsFt3' as "kitsFt3" from products p
     join product_versions v on v.product_id = p.id order by p.code, v.effective_on desc`,
  );
  const lots = await rows<{ number: string }>(
    em,
    `select number from lot_status where status = 'in-use' and (expires_on is null or expires_on >= current_date)
     order by number limit 500`,
  );
  return {
    workOrder: { number: order.number, title: order.title, zone: order.zone },
    contractor: order.contractor,
    owner: order.owner ?? '',
    design: planned.map(({ structure_number, kind, design }) => ({
      ...design,
      structureNumber: structure_number,
      kind,
    })),
    products,
    lots,
    standardNumber: order.standard ?? 0,
  };
}
