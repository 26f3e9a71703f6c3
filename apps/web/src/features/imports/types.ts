import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

export type Tower = Shapes['Tower'];
/** How a file is read; what is left out takes the usual value. */
export type Mapping = Partial<Omit<Shapes['Mapping'], 'columns' | 'units'>> & {
  columns?: Record<string, string>;
  units?: Record<string, string>;
};
export type Upload = Omit<Shapes['Upload'], 'mapping'> & { mapping: Mapping | null };
export type Proposal = Omit<Shapes['Proposal'], 'mapping'> & { mapping: Mapping };
export type ProposedColumn = Shapes['ProposedColumn'];
export type Question = Shapes['Question'];
export type Preview = Shapes['Preview'];
export type Import = Shapes['Import'];
export type RefusedRow = Shapes['RefusedRow'];
