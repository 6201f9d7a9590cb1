import type { NestInstance, NestSlab } from '../types';
import type { PartShape } from './part-shape';

/** One part of an item and where it lies in it: x at mid-depth from the item's own start at mid-depth, in the item's plain position. */
export interface Member {
  /** Index into the instance's `parts` of a part with this shape. */
  readonly part: number;
  readonly shape: PartShape;
  readonly at: number;
}

/** Something that is laid in one go: a part, or the parts of a group glued into one. Equal ones are one item with a demand. */
export interface Item {
  readonly index: number;
  readonly depth: number;
  /** Length of the upright box round it. */
  readonly box: number;
  /** From the box's left side to the trapezoid's start at mid-depth. */
  readonly start: number;
  readonly mid: number;
  readonly left: number;
  readonly right: number;
  readonly area: number;
  readonly turn: boolean;
  readonly over: boolean;
  /** Every member is exactly its trapezoid. */
  readonly exact: boolean;
  readonly members: readonly Member[];
}

/** Ids of the parts (one for each member) that one copy of an item stands for. */
export interface Copy {
  readonly item: number;
  readonly ids: readonly string[];
}

/** One way to settle a choice (or several that a group ties together). */
export interface Option {
  readonly copies: readonly Copy[];
  /** By item. */
  readonly need: readonly number[];
  readonly picks: readonly { readonly id: string; readonly option: number }[];
}

export interface Choice {
  readonly options: readonly Option[];
}

export interface Stock {
  readonly index: number;
  readonly slab: NestSlab;
  /** Between the trims. */
  readonly usable: number;
  readonly trim: number;
  readonly depth: number;
  readonly price: number;
  /** Infinity for as many as wanted. */
  readonly count: number;
}

export interface Problem {
  readonly instance: NestInstance;
  readonly kerf: number;
  readonly items: readonly Item[];
  readonly stock: readonly Stock[];
  readonly fixed: Option;
  readonly choices: readonly Choice[];
}

/** How many of each item are to be cut when the choices are settled so. */
export function demandOf(problem: Problem, picked: readonly number[]): number[] {
  const demand = [...problem.fixed.need];
  problem.choices.forEach((choice, c) => choice.options[picked[c]!]!.need.forEach((n, i) => (demand[i]! += n)));
  return demand;
}
