/** The job file of a new folder: complete, commented, and to be screened as it stands. */
export const STARTER_JOB = `# A job of daystrain. All figures here are invented: put your own in, line by line.
#   daystrain check .      says in words what it understands
#   daystrain screen .     screens it
# Every quantity has a unit: 600 mm, 24 in, 70 GPa, 6.5e-6 / degF. A line that begins with # is not read.

title: My first run (invented)
units: SI                          # how results are written; US for kip, in, ksi and °F

record:
  file: record.csv                 # time, and one column a channel with its unit: rail [degC]
  gaps: { fill_up_to: 3 h }        # short gaps are bridged and counted, longer ones bridged and not counted
  represents: 1 year               # how long a time one pass through the record stands for

zones:                             # each part of the building with one temperature history
  rail: { column: rail }           # the metal itself
  deck: { column: deck }           # the structure behind it

extremes:                          # hotter and colder than the record, for peak forces and movements only
  - { name: hot,  rail: 75 degC,  deck: 25 degC }
  - { name: cold, rail: -20 degC, deck: 2 degC }

limits:
  design_life: 50 years
  damage: 1.0                      # allowed Miner sum; the factors too are those of the code you work under
  load_factor: 1.0
  member_factor: 1.35
  fastener_factor: 1.35
  static_factor: 1.5

members:
  - id: rail
    modulus: 70 GPa                # aluminium; steel 210 GPa, stainless steel 200 GPa
    expansion: 23e-6 / K           # aluminium; steel 12e-6 / K, stainless steel 16e-6 / K
    area: 450 mm^2
    thickness: 4 mm
    hole: 14 mm                    # the net area is the area less the hole; or give net_area itself
    yield: 160 MPa
    inertia: 115000 mm^4           # weak axis
    buckling: EN                   # or AISC, which needs no imperfection and no plateau
    buckling_imperfection: 0.20
    buckling_plateau: 0.10
    buckling_factor: 0.909         # 1/γ_M1, or φ
    curve: detail

fasteners:
  - id: bracket                    # a bolt in a tight hole, on a bracket
    stiffness: 8 kN/mm             # or from a test: shear_displacement: 2.0 mm at 10 kN
    bracket_length: 60 mm          # leave the next three out where the fastener sits on the structure itself
    bracket_modulus: 210 GPa
    bracket_inertia: 2500 mm^4
    shear_resistance: 12 kN
    shear_range_limit: 5 kN        # from the product specification; leave it out where there is none
    curve: bolt
  - id: bracket slotted            # the same in a slot
    stiffness: 8 kN/mm
    bracket_length: 60 mm
    bracket_modulus: 210 GPa
    bracket_inertia: 2500 mm^4
    free_play: 9 mm                # each way from the middle of the slot
    diameter: 12 mm
    tightening_torque: 5 N m       # the grip is estimated from the torque; or give grip: 250 N
    friction: 0.2
    grip_share: 0.5                # what is left of the preload after years
    shear_resistance: 12 kN
    shear_range_limit: 5 kN
    curve: bolt

curves:                            # S-N curves of the details, from the code or the product specification
  - { id: detail, shape: EN 1993-1-9 direct 71 }
  - { id: bolt, points: [[1e4, 16 kN], [1e5, 10.1 kN], [1e6, 6.4 kN], [5e6, 4.6 kN]] }

runs:
  - id: R1                         # twelve tight brackets
    member: rail
    zone: rail
    fastener: bracket
    count: 12
    spacing: 600 mm
    overhang: 150 mm
    lock_in: 15 degC               # or a time, at 2031-04-12T10:00, or what it may have been, 5 degC to 25 degC
    structure_zone: deck           # leave these three out where the structure does not move
    structure_expansion: 10e-6 / K
    structure_lock_in: 12 degC
  - id: R2                         # the same length in slots but for the middle bracket
    member: rail
    zone: rail
    fastener: bracket
    fixed: middle
    slotted: bracket slotted
    count: 12
    spacing: 600 mm
    overhang: 150 mm
    lock_in: 15 degC
    setting_tolerance: 1 mm
`;
