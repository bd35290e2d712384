/**
 * The planned link as an immutable tree of records, with the catalogues of fibre and detector classes and the registry
 * of its parameters.
 *
 * <p>Every record mirrors one object of the scenario file, component by component;
 * {@link binspan.scenario.ScenarioSections} states unit, range, default and meaning of each once, for reading, listing,
 * sweeping and the JSON Schema alike. Component names carry the trade unit of the file; no physics is computed here
 * beyond looking up a class.
 */
package binspan.scenario;
