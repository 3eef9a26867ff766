export const HELP = `Steelyard: the balance of a small unmanned blimp.

  npm run -s craft -- balance FILE [--json] [--units metric|imperial]
      How the craft floats, what is wrong with it, and the least lead that
      levels it. --json gives one object of rows in SI units instead.
  npm run -s craft -- check FILE...
      Whether each file is a craft file whose hull can be formed.
  npm run -s craft -- plan FILE [--robust] [--json] [--write OUT]
                      [--time-limit SECONDS] [--units metric|imperial]
      The least dead ballast that keeps every target: what to hang, slide and
      carry, what stands in the way of less, and the proof. --robust holds it
      for every mass within its tolerance; --write keeps the planned craft.
  npm run -s craft -- carry FILE [--line keel|axis|HARDPOINT] [--json]
      The most useful load at each station of a line, the rest planned anew.
  npm run -s craft -- turn FILE [--vector DEG] [--throttle F] [--speed M/S]
                      [--planned] [--all | --json] [--units metric|imperial]
      How it turns, flies and climbs by its thrusters: arm and yaw moment, time
      to yaw 90°, radius, side gust held, top speed, pitch under way.
      --vector: thrust turned in yaw by so many degrees, + to starboard, instead
      of as hard to starboard as it goes; --throttle: share of full thrust, 0 to
      1; --speed: of the cruise it turns from, in m/s; --planned: of the craft
      with its ballast plan carried out; --all: every figure there is.
  npm run -s craft -- place FILE --part ID|NAME [--stations N] [--throttle F]
                      [--json | --csv] [--units metric|imperial]
      Where that thruster had better sit: moved through N stations (61) from
      nose to tail, the ballast planned anew at each, what it then does, what
      its propeller would strike, and which stations nothing beats. Exit 1 when
      there is none with both a plan and room for the propeller.
  npm run -s craft -- help
  npm run -s craft -- --version

FILE is a craft file; "-" reads it from standard input. Without -s npm prints
a banner of its own before the report.

Exit codes: 0 fine; 1 the craft does not meet its targets, no plan can, or it
has no thruster to turn it; 2 bad input or use.
Errors go to standard error, one line a problem.

It is an aid for planning. The aviation authority, the site and the makers of
film, gas, cells and motors have the last word.
`;
