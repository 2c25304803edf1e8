import { join } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import * as library from './index';
import { sampleInput } from './testing/systems';

/** Endings that say the unit. */
const unitEndings =
  /(Psi|Psia|Pa|Cfm|Gpm|Gal|Ft|In|In2|F|J|Kg|KgS|KgM3|WM2K|Percent|Dba|Hours|Seconds)$|^hours$/;

/** Pure numbers by name: ratios, exponents, weights, and counts of things. */
const namedRatios = new Set([
  'pressureRatio',
  'scoreRatio',
  'airOverWaterRatio',
  'tooSmallRatio',
  'dimensionRatio',
  'temperatureFactor',
  'surgeFactor',
  'couplingFactor',
  'usualCouplingFactor',
  'timeFactor',
  'usualTimeFactor',
  'polytropicExponent',
  'adiabaticExponent',
  'elevationWeight',
  'distanceWeight',
  'outletMach',
  'cycleCount',
  'couplings',
  'stages',
  'place',
  'number',
  'runs',
  'parts',
  'zones',
]);

const named = (name: string): boolean => unitEndings.test(name) || namedRatios.has(name);
/** Functions also take plain words for what they are about: `galPerFtOfBore`, `permittedHours`. */
const namedFunction = (name: string): boolean =>
  named(name) || /^galPerFtOf/.test(name) || namedRatios.has(name);

const entry = join(__dirname, 'index.ts');
const program = ts.createProgram([entry], {
  strict: true,
  target: ts.ScriptTarget.ES2023,
  module: ts.ModuleKind.NodeNext,
  moduleResolution: ts.ModuleResolutionKind.NodeNext,
  customConditions: ['source'],
  noEmit: true,
  types: [],
});
const checker = program.getTypeChecker();

/** Number, a branded number, or either with null or undefined. */
function isNumeric(type: ts.Type): boolean {
  if (type.isUnion()) {
    const parts = type.types.filter((part) => !(part.flags & (ts.TypeFlags.Null | ts.TypeFlags.Undefined)));
    return parts.length > 0 && parts.every(isNumeric);
  }
  if (type.isIntersection()) return type.types.some(isNumeric);
  return (type.flags & ts.TypeFlags.NumberLike) !== 0;
}

/** Names of every number in the public types: properties, parameters, results of functions, constants. */
function exportedNumbers(): { fields: string[]; functions: string[] } {
  const file = program.getSourceFile(entry);
  const module = file && checker.getSymbolAtLocation(file);
  if (!file || !module) throw new Error('the library was not read');
  const fields: string[] = [];
  const functions: string[] = [];
  for (const exported of checker.getExportsOfModule(module)) {
    const symbol = exported.flags & ts.SymbolFlags.Alias ? checker.getAliasedSymbol(exported) : exported;
    if (symbol.flags & (ts.SymbolFlags.Interface | ts.SymbolFlags.TypeAlias)) {
      const declared = checker.getDeclaredTypeOfSymbol(symbol);
      if (!(declared.flags & ts.TypeFlags.Object)) continue;
      for (const property of checker.getPropertiesOfType(declared)) {
        if (isNumeric(checker.getTypeOfSymbolAtLocation(property, file))) fields.push(property.name);
      }
    }
    if (!(symbol.flags & (ts.SymbolFlags.Function | ts.SymbolFlags.Variable))) continue;
    const type = checker.getTypeOfSymbolAtLocation(symbol, file);
    if (isNumeric(type)) fields.push(exported.name);
    for (const signature of type.getCallSignatures()) {
      if (isNumeric(signature.getReturnType())) functions.push(exported.name);
      for (const parameter of signature.getParameters()) {
        if (isNumeric(checker.getTypeOfSymbolAtLocation(parameter, file))) fields.push(parameter.name);
      }
    }
  }
  return { fields, functions };
}

describe('every exported number carries its unit in its name or is a named ratio', () => {
  const { fields, functions } = exportedNumbers();

  it('in types, parameters and constants', () => {
    expect(fields.length).toBeGreaterThan(100);
    const nameless = fields.filter((name) => !named(name));
    expect(nameless).toEqual([]);
  });
  it('and in what functions give back', () => {
    expect(functions.length).toBeGreaterThan(3);
    expect(functions.filter((name) => !namedFunction(name))).toEqual([]);
  });
  it('in constants at run time', () => {
    const constants = Object.entries(library).filter(([, value]) => typeof value === 'number');
    expect(constants.length).toBeGreaterThan(5);
    expect(constants.map(([name]) => name).filter((name) => !named(name))).toEqual([]);
  });
  it('in a whole plan, explanations and reasons included', () => {
    const nameless = new Set<string>();
    walk(library.planSystem(sampleInput), '', nameless);
    expect([...nameless]).toEqual([]);
  });
  it('and would notice one that does not', () => {
    expect(named('pressure')).toBe(false);
    expect(named('flow')).toBe(false);
    const nameless = new Set<string>();
    walk({ deep: [{ pressure: 3 }] }, '', nameless);
    expect([...nameless]).toEqual(['pressure']);
  });
});

/** An assumption says in `field` what its `value` is; a result's `value` is called what the result is called. */
function walk(value: unknown, name: string, nameless: Set<string>): void {
  if (typeof value === 'number' && !named(name)) nameless.add(name);
  if (Array.isArray(value)) value.forEach((item) => walk(item, name, nameless));
  else if (typeof value === 'object' && value !== null) {
    const field = 'field' in value && typeof value.field === 'string' ? value.field : name;
    for (const [key, inner] of Object.entries(value)) walk(inner, key === 'value' ? field : key, nameless);
  }
}
