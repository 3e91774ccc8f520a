/**
 * What stands on the bench, or what a person says they do with it, by process. A question names the machine more often than the
 * process; these join the process's own other names.
 */
export const MACHINE_WORDS: Readonly<Record<string, readonly string[]>> = {
  'laser-cutting': ['laser', 'lasering', 'laser cutter', 'laser bed', 'laser tube'],
  'laser-engraving': ['engrave', 'engraver', 'laser engraver', 'laser etching', 'laser marking', 'rastering'],
  'filament-printing': ['3d printer', '3d print', 'printer', 'print', 'filament printer', 'extruder', 'hot end'],
  'resin-printing': ['resin printer', 'resin print', 'resin 3d printer', 'resin 3d print', 'vat printer'],
  'resin-washing': ['wash station', 'wash resin prints', 'resin wash', 'curing station'],
  soldering: ['solder', 'soldering iron', 'solder station', 'reflow oven', 'hot air rework'],
  welding: ['weld', 'welder', 'welding torch', 'arc welder', 'wire feed welder'],
  brazing: ['braze', 'brazing torch'],
  grinding: ['grinder', 'angle grinder', 'bench grinder', 'grinding wheel', 'cut-off wheel'],
  sanding: ['sander', 'belt sander', 'disc sander', 'sandpaper', 'orbital sander'],
  sawing: ['saw', 'table saw', 'band saw', 'mitre saw', 'miter saw', 'router', 'cnc router', 'jigsaw'],
  'hot-wire-cutting': ['hot wire', 'hot wire cutter', 'hot knife', 'foam cutter'],
  'heat-bending': ['strip heater', 'line bender', 'heat gun', 'vacuum former', 'vacuum forming', 'thermoforming'],
  'flame-polishing': ['flame polish', 'flame polishing torch'],
  'solvent-cementing': ['solvent welding', 'solvent weld'],
  gluing: ['glue', 'glueing', 'stick together', 'hot glue gun'],
  'vapour-smoothing': ['vapour smooth', 'acetone smoothing', 'vapour polishing', 'vapour bath'],
  'spray-painting': ['spray', 'spraying', 'spray gun', 'spray booth', 'airbrush', 'paint booth', 'spray painting'],
  'resin-casting': ['resin pour', 'pour resin', 'cast resin', 'pressure pot', 'mould casting'],
  laminating: ['laminator', 'lay-up', 'hand lay-up', 'vacuum bagging', 'fibreglassing'],
  'blade-cutting': ['vinyl cutter', 'drag knife', 'craft cutter', 'cutting plotter', 'knife cutter', 'guillotine'],
  'heat-pressing': ['heat press', 'ironing on', 'transfer press', 'sublimation press'],
  'screen-printing': ['screen print', 'silk screen', 'squeegee', 'screen press'],
  'kiln-firing': ['kiln', 'pottery kiln', 'glaze firing', 'bisque firing', 'furnace'],
  electroplating: ['electroplate', 'plating', 'plating bath', 'plating tank', 'anodising'],
  'powder-coating': ['powder coat', 'powder gun', 'curing oven'],
};
