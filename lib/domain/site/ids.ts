/** Ids are opaque strings; the brand keeps a printer's id from being passed where a station's is meant. */
declare const brand: unique symbol;
type Branded<Name extends string> = string & { readonly [brand]: Name };

export type SiteId = Branded<'site'>;
export type AreaId = Branded<'area'>;
export type TillId = Branded<'till'>;
export type PrinterId = Branded<'printer'>;
export type StationId = Branded<'station'>;
export type SectionId = Branded<'section'>;
export type ItemId = Branded<'item'>;
export type OptionGroupId = Branded<'optionGroup'>;
export type OptionId = Branded<'option'>;
export type CourseId = Branded<'course'>;
export type SharedPointId = Branded<'sharedPoint'>;
export type PlanId = Branded<'plan'>;
export type RuleId = Branded<'rule'>;
export type PersonId = Branded<'person'>;

/** Marks a string read from outside (a row, a fixture) as an id of the kind asked for. */
export const asId = <Id extends string>(value: string): Id => value as Id;
