import { measureDrag } from './window.mjs'

/**
 * The list of what is measured.
 *
 * @param engine - the bundled engine with its benchmark rigs
 * @param references - the C references by method; each call runs one and gives its seconds
 * @returns rows { name, ours, against, atMost, warm, repeats }; ours and against give seconds,
 *   at once or later
 */
export function listBenches(engine, references) {
  const time = (march, rig) => () => {
    const start = performance.now()
    march(rig)
    return (performance.now() - start) / 1000
  }
  const waves = (rig) => time(engine.marchRig, rig)
  const elements = (rig) => time(engine.marchElements, rig)
  const row = (name, ours, against, atMost, warm, repeats) => ({ name, ours, against, atMost, warm, repeats })
  const small = [1000, 4000]
  const large = [10_000, 40_000]

  return [
    row(
      'characteristics, every cell differs, 10,000 x 40,000',
      waves(engine.makeGradedRig(...large)),
      () => references.waves('graded', ...large, 1),
      1.3,
      2,
      7,
    ),
    row(
      'characteristics, every cell differs, 1,000 x 4,000',
      waves(engine.makeGradedRig(...small)),
      () => references.waves('graded', ...small, 1),
      null,
      20,
      31,
    ),
    row(
      'characteristics, 8 uniform sections, 10,000 x 40,000',
      waves(engine.makeSteppedRig(8, ...large)),
      () => references.waves('uniform', ...large, 1),
      0.1,
      4,
      9,
    ),
    row(
      'characteristics, 8 uniform sections, 1,000 x 4,000',
      waves(engine.makeSteppedRig(8, ...small)),
      () => references.waves('uniform', ...small, 1),
      0.4,
      60,
      51,
    ),
    ...[2, 5, 10, 20, 50, 100, 200].map((sections) =>
      row(
        `  curve: ${sections} sections against 8, 10,000 x 40,000`,
        waves(engine.makeSteppedRig(sections, ...large)),
        waves(engine.makeSteppedRig(8, ...large)),
        null,
        2,
        5,
      ),
    ),
    row(
      '  curve: 8 sections, 10,000 cells against 2,500, same steps',
      waves(engine.makeSteppedRig(8, 10_000, 40_000)),
      waves(engine.makeSteppedRig(8, 2_500, 40_000)),
      null,
      2,
      5,
    ),
    row(
      'decays to nothing against one that does not, graded',
      waves(engine.makeDecayingRig(2000, 80_000)),
      waves(engine.makeGradedRig(2000, 80_000)),
      1.1,
      2,
      7,
    ),
    row(
      'decays to nothing against one that does not, uniform',
      waves(engine.makeDecayingSteppedRig(8, 2000, 400_000)),
      waves(engine.makeSteppedRig(8, 2000, 400_000)),
      1.1,
      2,
      5,
    ),
    row(
      'elements, linear, 1,000 x 4,000',
      elements(engine.makeGradedRig(...small)),
      () => references.elements('linear', ...small, 1),
      2.5,
      20,
      31,
    ),
    row(
      'elements, linear, 10,000 x 10,000',
      elements(engine.makeGradedRig(10_000, 10_000)),
      () => references.elements('linear', 10_000, 10_000, 1),
      2.5,
      2,
      7,
    ),
    row(
      'elements, plastic, 1,000 x 4,000',
      elements(engine.makePlasticRig(...small)),
      () => references.elements('plastic', ...small, 1),
      3,
      20,
      31,
    ),
    row(
      'elements, plastic, 10,000 x 10,000',
      elements(engine.makePlasticRig(10_000, 10_000)),
      () => references.elements('plastic', 10_000, 10_000, 1),
      3,
      2,
      7,
    ),
    // Once: the longest task of all is asked for, no median.
    row('window: longest task over 50 ms while dragging', measureDrag, () => 0.05, 1, 0, 1),
  ]
}
