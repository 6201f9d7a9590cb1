import type { Knex } from 'knex';

import { belongsTo, byPerson, createTenantTable, TIMESTAMP } from './tables/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await createTenantTable(knex, 'stock_slabs', ['select', 'insert', 'update', 'delete'], (t) => {
    slabColumns(t, 'stock_slabs');
    t.integer('price_cents').notNullable();
    t.integer('count').comment('Null: as many as wanted');
    t.decimal('trim', null).comment('Factory end, in; null: the layout says');
    t.decimal('measured_depth', null).comment("in, where the maker's figure is off");
    t.decimal('crook', null).comment('Bow of the edge over the whole length, in');
    t.decimal('straightening', null).comment('Taken off to straighten an edge, in');
    t.text('supplier').notNullable().defaultTo('');
    t.timestamp('updated_at', TIMESTAMP).notNullable().defaultTo(knex.fn.now(3));
    t.check('price_cents >= 0', {}, 'stock_slabs_price_not_negative');
    t.check('count >= 0', {}, 'stock_slabs_count_not_negative');
    t.check('trim >= 0 and 2 * trim < length', {}, 'stock_slabs_trim_leaves_wood');
    t.check('measured_depth > 0', {}, 'stock_slabs_measured_depth_positive');
    t.check('crook >= 0', {}, 'stock_slabs_crook_not_negative');
    t.check('straightening >= 0 and straightening < depth', {}, 'stock_slabs_straightening_leaves_wood');
  });

  await createTenantTable(knex, 'rack_pieces', ['select', 'insert', 'update'], (t) => {
    slabColumns(t, 'rack_pieces');
    t.integer('price_cents').notNullable().defaultTo(0);
    t.decimal('left_angle_deg', null).notNullable().defaultTo(90);
    t.decimal('right_angle_deg', null).notNullable().defaultTo(90);
    t.text('place').notNullable().defaultTo('').comment('Where it lies');
    belongsTo(t, 'rack_pieces', 'from_job_id', 'jobs', 'optional');
    belongsTo(t, 'rack_pieces', 'taken_by_job_id', 'jobs', 'optional');
    t.timestamp('taken_at', TIMESTAMP);
    byPerson(t, 'rack_pieces', 'person_id');
    t.check('price_cents >= 0', {}, 'rack_pieces_price_not_negative');
    t.check('left_angle_deg > 0 and left_angle_deg < 180', {}, 'rack_pieces_left_angle_possible');
    t.check('right_angle_deg > 0 and right_angle_deg < 180', {}, 'rack_pieces_right_angle_possible');
    t.check('(taken_at is null) = (taken_by_job_id is null)', {}, 'rack_pieces_taken_by_a_job');
  });
}

/** What a bought slab and an offcut have in common. */
function slabColumns(t: Knex.CreateTableBuilder, table: string): void {
  t.text('code').notNullable().comment('Short name written on the wood and in plans');
  t.text('species').notNullable();
  t.decimal('thickness', null).notNullable().comment('in');
  t.decimal('length', null).notNullable().comment('in, along the grain');
  t.decimal('depth', null).notNullable().comment('in');
  t.text('batch').notNullable().defaultTo('');
  t.text('faces').notNullable().defaultTo('both');
  t.jsonb('defects').notNullable().defaultTo('[]').comment('Rectangles, in, from the lower left corner');
  t.unique(['shop_id', 'code'], { indexName: `${table}_code_key` });
  t.check("code <> ''", {}, `${table}_code_given`);
  t.check('thickness > 0 and length > 0 and depth > 0', {}, `${table}_sizes_positive`);
  t.check("faces in ('both', 'one')", {}, `${table}_faces_known`);
  t.check("jsonb_typeof(defects) = 'array'", {}, `${table}_defects_list`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('rack_pieces');
  await knex.schema.dropTable('stock_slabs');
}
