/**
 * Model workbooks by the hundred, with faults seeded on purpose, as an adversary to the audit that
 * shares no code with it. {@link weighhouse.generator.Generator} makes cases from a seed, {@link
 * weighhouse.generator.GeneratorMain} writes them with a manifest, {@code score} holds audits
 * against it. Go on to {@code model} (what is modelled), {@code fault} (what goes wrong), {@code
 * layout} (where it stands) and {@code lookalike} (what only looks like a model).
 */
package weighhouse.generator;
