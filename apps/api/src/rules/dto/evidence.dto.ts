import type { Comparison, Truth } from '@lidwatch/atmosphere';
import {
  explain,
  fromEvidence,
  MEASURES,
  measuredInWords,
  sentencesOf,
  type EvaluatedClause,
  type EvaluatedNode,
  type HeldFacts,
} from '@lidwatch/rules';
import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { RangeValue, showRange } from '../../profiles/dto/range-value.dto';
import type { EvidenceBody, KeptEvidence } from '../evaluation/evidence.service';

const truths = ['true', 'false', 'not known'];

/** For how long a condition held, beside what was asked, in minutes. */
@ApiSchema({ name: 'HeldFacts' })
export class HeldFactsDto implements HeldFacts {
  @ApiProperty() neededMinutes!: number;
  @ApiProperty() toleratedMinutes!: number;
  @ApiProperty() recordMinutes!: number;
  @ApiProperty() trueMinutes!: number;
  @ApiProperty() falseMinutes!: number;
  @ApiProperty() notKnownMinutes!: number;
  @ApiPropertyOptional({ description: 'Minutes it has been true without a break, where longer than asked' })
  unbrokenMinutes?: number;
  @ApiPropertyOptional({
    type: Boolean,
    description: 'It was true since the record begins, perhaps for longer',
  })
  unbrokenOrMore?: true;
  @ApiPropertyOptional({ enum: ['change of tower', 'start of record', 'nothing on record'] })
  recordStartsAfter?: NonNullable<HeldFacts['recordStartsAfter']>;
}

/** A condition as it was found: a clause with what was measured, or a group with its parts. */
@ApiSchema({ name: 'EvaluatedNode' })
export class EvaluatedNodeDto {
  @ApiProperty({ enum: ['clause', 'all', 'any', 'not'] }) kind!: EvaluatedNode['kind'];
  @ApiProperty({ enum: truths, description: 'What counts, held-for included' }) truth!: Truth;
  @ApiProperty({ enum: truths, description: 'What holds at this block' }) now!: Truth;
  @ApiProperty({ description: 'The condition and what was found, in one sentence' }) sentence!: string;
  @ApiPropertyOptional({ type: HeldFactsDto }) held?: HeldFactsDto;
  @ApiPropertyOptional({ enum: Object.keys(MEASURES) }) measure?: string;
  @ApiPropertyOptional({ enum: ['>=', '>', '<=', '<', '='] }) op?: Comparison;
  @ApiPropertyOptional({ oneOf: [{ type: 'number' }, { type: 'boolean' }] }) value?: number | boolean;
  @ApiPropertyOptional({ type: RangeValue }) measured?: RangeValue;
  @ApiPropertyOptional({ type: () => [EvaluatedNodeDto] }) parts?: EvaluatedNodeDto[];
}

/** The evidence in sentences, groups first and their parts indented below them. */
export class EvidenceSentences {
  @ApiProperty({ type: [String] }) en!: string[];
  @ApiProperty({ type: [String] }) es!: string[];
}

/** Why something was proposed or issued. */
@ApiSchema({ name: 'Evidence' })
export class EvidenceDto {
  @ApiProperty({ type: EvaluatedNodeDto }) tree!: EvaluatedNodeDto;
  @ApiProperty({ type: EvidenceSentences }) sentences!: EvidenceSentences;
  @ApiProperty({ description: 'SHA-256 of the evidence as it is kept' }) sha256!: string;
}

function showNode(node: EvaluatedNode): EvaluatedNodeDto {
  const { kind, truth, now, held } = node;
  const sentence = explain(node, 'en').text;
  const common = { kind, truth, now, sentence, ...(held && { held }) };
  if (node.kind !== 'clause') return { ...common, parts: node.parts.map(showNode) };
  const { measure, op, value } = node;
  return { ...common, measure, op, value, measured: showRange(node.measured) };
}

/** Kept evidence in the API's shape. */
export function showEvidence({ body, sha256 }: KeptEvidence): EvidenceDto {
  const tree = fromEvidence(body.tree);
  const sentences = { en: sentencesOf(explain(tree, 'en')), es: sentencesOf(explain(tree, 'es')) };
  return { tree: showNode(tree), sentences, sha256 };
}

/** What was measured where it decided, in one line: at most three clauses, those that are met. */
export function summaryOf({ tree }: EvidenceBody): string {
  const clauses = clausesOf(fromEvidence(tree));
  const met = clauses.filter(({ truth }) => truth === 'true');
  const said = (met.length > 0 ? met : clauses).slice(0, 3).map(({ measure, measured }) => {
    const { label, kind } = MEASURES[measure];
    return `${label.en}${kind === 'yes-no' ? ':' : ''} ${measuredInWords(measure, measured, 'en')}`;
  });
  return `${said.join('; ')}.`;
}

const clausesOf = (node: EvaluatedNode): EvaluatedClause[] =>
  node.kind === 'clause' ? [node] : node.parts.flatMap(clausesOf);
