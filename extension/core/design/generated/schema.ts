// Generated from schemas/gain-module.schema.json; see schemas/generate.mjs.
import type { Condition, SectionSchema } from '../schema.ts';

export const GAIN_MODULE_SCHEMA: SectionSchema = {
 "kind": "section",
 "description": "One Q-switched gain module: medium, pump, resonator, switch, the surfaces that the beam meets and what the pulse must be.",
 "keys": {
  "format": {
   "kind": "choice",
   "description": "Version of this file format.",
   "allowed": [
    1
   ]
  },
  "title": {
   "kind": "text",
   "description": "What the module is, as it should head the readout.",
   "examples": [
    "Hail-sounding lidar transmitter, build C"
   ]
  },
  "gain_medium": {
   "kind": "section",
   "description": "The laser medium and the line it lases on. Properties left out come from the property table.",
   "keys": {
    "material": {
     "kind": "text",
     "description": "A row of the property table, named by composition.",
     "examples": [
      "Nd:YAG"
     ]
    },
    "wavelength": {
     "kind": "quantity",
     "description": "Laser wavelength in vacuum.",
     "default": "the material's strongest line in the property table",
     "examples": [
      "1064 nm"
     ],
     "dimension": "length",
     "limits": [
      {
       "bound": "above",
       "text": "0 nm",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "100 nm",
       "value": 1e-7
      },
      {
       "bound": "at most",
       "text": "20 um",
       "value": 0.00002
      }
     ],
     "usual": {
      "low": {
       "text": "400 nm",
       "value": 4e-7
      },
      "high": {
       "text": "5 um",
       "value": 0.000005
      }
     }
    },
    "length": {
     "kind": "quantity",
     "description": "Length of the medium along the beam, passed twice per round trip.",
     "examples": [
      "60 mm"
     ],
     "dimension": "length",
     "limits": [
      {
       "bound": "above",
       "text": "0 mm",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 um",
       "value": 0.000001
      },
      {
       "bound": "at most",
       "text": "100 m",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "0.1 mm",
       "value": 0.0001
      },
      "high": {
       "text": "500 mm",
       "value": 0.5
      }
     }
    },
    "diameter": {
     "kind": "quantity",
     "description": "Clear diameter of the medium. Truncates nothing; the beams are checked against it.",
     "default": "not given: the beams are not checked against it",
     "examples": [
      "5 mm"
     ],
     "dimension": "length",
     "limits": [
      {
       "bound": "above",
       "text": "0 mm",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 um",
       "value": 0.000001
      },
      {
       "bound": "at most",
       "text": "10 m",
       "value": 10
      }
     ],
     "usual": {
      "low": {
       "text": "0.2 mm",
       "value": 0.0002
      },
      "high": {
       "text": "200 mm",
       "value": 0.2
      }
     }
    },
    "emission_cross_section": {
     "kind": "quantity",
     "description": "Effective stimulated-emission cross-section at the laser line: manifold-effective for four-level media.",
     "default": "the property table's row for the material and line",
     "examples": [
      "2.8e-19 cm2"
     ],
     "dimension": "cross_section",
     "limits": [
      {
       "bound": "above",
       "text": "0 cm2",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1e-30 cm2",
       "value": 1e-34
      },
      {
       "bound": "at most",
       "text": "1e-12 cm2",
       "value": 1e-16
      }
     ],
     "usual": {
      "low": {
       "text": "1e-22 cm2",
       "value": 1e-26
      },
      "high": {
       "text": "1e-17 cm2",
       "value": 1e-21
      }
     }
    },
    "absorption_cross_section": {
     "kind": "quantity",
     "description": "Reabsorption cross-section at the laser line, of ions in the lower manifold; 0 for a four-level line.",
     "default": "the property table's row for the material and line",
     "examples": [
      "0 cm2"
     ],
     "dimension": "cross_section",
     "limits": [
      {
       "bound": "at least",
       "text": "0 cm2",
       "value": 0
      },
      {
       "bound": "at most",
       "text": "1e-12 cm2",
       "value": 1e-16
      }
     ],
     "usual": {
      "low": {
       "text": "0 cm2",
       "value": 0
      },
      "high": {
       "text": "1e-17 cm2",
       "value": 1e-21
      }
     }
    },
    "ion_density": {
     "kind": "quantity",
     "description": "Density of active ions. Needed where the absorption cross-section is not 0.",
     "default": "the property table's row for the material and line",
     "examples": [
      "1.38e20 cm-3"
     ],
     "dimension": "number_density",
     "limits": [
      {
       "bound": "above",
       "text": "0 cm-3",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1e6 cm-3",
       "value": 1000000000000
      },
      {
       "bound": "at most",
       "text": "1e24 cm-3",
       "value": 1e+30
      }
     ],
     "usual": {
      "low": {
       "text": "1e18 cm-3",
       "value": 1e+24
      },
      "high": {
       "text": "3e22 cm-3",
       "value": 3e+28
      }
     }
    },
    "upper_level_lifetime": {
     "kind": "quantity",
     "description": "Fluorescence lifetime of the upper level.",
     "default": "the property table's row for the material and line",
     "examples": [
      "230 us"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "above",
       "text": "0 us",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 ps",
       "value": 1e-12
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "100 ns",
       "value": 1e-7
      },
      "high": {
       "text": "30 ms",
       "value": 0.03
      }
     }
    },
    "lower_level_lifetime": {
     "kind": "quantity",
     "description": "Lifetime of the lower level. Given here, it selects the finite-lifetime model.",
     "default": "not given: the inversion reduction factor stands for the lower level",
     "examples": [
      "200 ps"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "above",
       "text": "0 ps",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 fs",
       "value": 1e-15
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "1 ps",
       "value": 1e-12
      },
      "high": {
       "text": "10 ms",
       "value": 0.01
      }
     }
    },
    "inversion_reduction_factor": {
     "kind": "quantity",
     "description": "How many units of inversion one emitted photon takes, γ: 1 for an empty lower level, 1 + f_l/f_u for a bottlenecked one. Given here, it holds for the whole pulse.",
     "default": "the property table's row for the material and line",
     "examples": [
      "1"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "at least",
       "text": "1",
       "value": 1,
       "why": "each photon takes at least one unit of inversion"
      },
      {
       "bound": "at most",
       "text": "5",
       "value": 5
      }
     ],
     "usual": {
      "low": {
       "text": "1",
       "value": 1
      },
      "high": {
       "text": "2",
       "value": 2
      }
     }
    },
    "refractive_index": {
     "kind": "quantity",
     "description": "Refractive index at the laser wavelength.",
     "default": "the property table's row for the material and line",
     "examples": [
      "1.82"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "at least",
       "text": "1",
       "value": 1,
       "why": "light in the medium is no faster than in vacuum"
      },
      {
       "bound": "at most",
       "text": "5",
       "value": 5
      }
     ],
     "usual": {
      "low": {
       "text": "1.3",
       "value": 1.3
      },
      "high": {
       "text": "2.6",
       "value": 2.6
      }
     }
    },
    "group_index": {
     "kind": "quantity",
     "description": "Group index at the laser wavelength; sets the round-trip time.",
     "default": "the property table's row for the material and line, else the refractive index",
     "examples": [
      "1.835"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "at least",
       "text": "1",
       "value": 1,
       "why": "a pulse in the medium is no faster than in vacuum"
      },
      {
       "bound": "at most",
       "text": "10",
       "value": 10
      }
     ],
     "usual": {
      "low": {
       "text": "1.3",
       "value": 1.3
      },
      "high": {
       "text": "2.8",
       "value": 2.8
      }
     }
    }
   },
   "required": [
    "material",
    "length"
   ]
  },
  "pump": {
   "kind": "section",
   "description": "How the medium is pumped: either the optical power that reaches it or the diodes that give it.",
   "keys": {
    "kind": {
     "kind": "choice",
     "description": "`pulsed`: one burst of `duration` before each opening; `continuous`: always on.",
     "allowed": [
      "pulsed",
      "continuous"
     ]
    },
    "wavelength": {
     "kind": "quantity",
     "description": "Pump wavelength in vacuum.",
     "examples": [
      "808 nm"
     ],
     "dimension": "length",
     "limits": [
      {
       "bound": "above",
       "text": "0 nm",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "100 nm",
       "value": 1e-7
      },
      {
       "bound": "at most",
       "text": "20 um",
       "value": 0.00002
      }
     ],
     "usual": {
      "low": {
       "text": "300 nm",
       "value": 3e-7
      },
      "high": {
       "text": "2.1 um",
       "value": 0.0000021
      }
     }
    },
    "power": {
     "kind": "quantity",
     "description": "Optical pump power that reaches the medium, while the pump is on.",
     "examples": [
      "600 W"
     ],
     "dimension": "power",
     "limits": [
      {
       "bound": "above",
       "text": "0 W",
       "value": 0,
       "why": "without a pump there is no inversion and no pulse"
      },
      {
       "bound": "at least",
       "text": "1 nW",
       "value": 1e-9
      },
      {
       "bound": "at most",
       "text": "1 GW",
       "value": 1000000000
      }
     ],
     "usual": {
      "low": {
       "text": "1 mW",
       "value": 0.001
      },
      "high": {
       "text": "100 MW",
       "value": 100000000
      }
     }
    },
    "diode": {
     "kind": "section",
     "description": "Pump diodes: power = (current − threshold_current) × slope_efficiency × count × delivery_efficiency.",
     "keys": {
      "current": {
       "kind": "quantity",
       "description": "Drive current of each diode or stack.",
       "examples": [
        "90 A"
       ],
       "dimension": "current",
       "limits": [
        {
         "bound": "above",
         "text": "0 A",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1 uA",
         "value": 0.000001
        },
        {
         "bound": "at most",
         "text": "1 MA",
         "value": 1000000
        }
       ],
       "usual": {
        "low": {
         "text": "50 mA",
         "value": 0.05
        },
        "high": {
         "text": "1000 A",
         "value": 1000
        }
       }
      },
      "threshold_current": {
       "kind": "quantity",
       "description": "Current at which a diode begins to lase.",
       "examples": [
        "12 A"
       ],
       "dimension": "current",
       "limits": [
        {
         "bound": "at least",
         "text": "0 A",
         "value": 0
        },
        {
         "bound": "at most",
         "text": "1 MA",
         "value": 1000000
        }
       ],
       "usual": {
        "low": {
         "text": "0 A",
         "value": 0
        },
        "high": {
         "text": "200 A",
         "value": 200
        }
       }
      },
      "slope_efficiency": {
       "kind": "quantity",
       "description": "Optical power of one diode or stack per ampere above threshold.",
       "examples": [
        "1.1 W/A"
       ],
       "dimension": "slope_efficiency",
       "limits": [
        {
         "bound": "above",
         "text": "0 W/A",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-6 W/A",
         "value": 0.000001
        },
        {
         "bound": "at most",
         "text": "1e4 W/A",
         "value": 10000
        }
       ],
       "usual": {
        "low": {
         "text": "0.1 W/A",
         "value": 0.1
        },
        "high": {
         "text": "100 W/A",
         "value": 100
        }
       }
      },
      "count": {
       "kind": "count",
       "description": "Number of diodes or stacks, all at the same current.",
       "examples": [
        "7"
       ],
       "least": 1,
       "most": 100000
      },
      "delivery_efficiency": {
       "kind": "quantity",
       "description": "Fraction of the diodes' light that reaches the medium.",
       "default": "100 %",
       "examples": [
        "95 %"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0 %",
         "value": 0,
         "why": "without pump light there is no inversion and no pulse"
        },
        {
         "bound": "at least",
         "text": "1e-7 %",
         "value": 1e-9
        },
        {
         "bound": "at most",
         "text": "100 %",
         "value": 1,
         "why": "optics pass no more than all of the light"
        }
       ],
       "usual": {
        "low": {
         "text": "20 %",
         "value": 0.2
        },
        "high": {
         "text": "100 %",
         "value": 1
        }
       }
      }
     },
     "required": [
      "current",
      "threshold_current",
      "slope_efficiency",
      "count"
     ],
     "order": {
      "lower": "threshold_current",
      "upper": "current",
      "strict": true,
      "because": "below its threshold current a diode gives no pump light"
     }
    },
    "duration": {
     "kind": "quantity",
     "description": "Length of the pump pulse. Pulsed pump only.",
     "examples": [
      "200 us"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "above",
       "text": "0 us",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 fs",
       "value": 1e-15
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "1 ns",
       "value": 1e-9
      },
      "high": {
       "text": "50 ms",
       "value": 0.05
      }
     }
    },
    "absorbed_fraction": {
     "kind": "quantity",
     "description": "Fraction of the pump power at the medium that the ions absorb.",
     "examples": [
      "85 %"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "above",
       "text": "0 %",
       "value": 0,
       "why": "what is not absorbed pumps nothing"
      },
      {
       "bound": "at least",
       "text": "1e-7 %",
       "value": 1e-9
      },
      {
       "bound": "at most",
       "text": "100 %",
       "value": 1,
       "why": "the medium absorbs no more than all of the pump"
      }
     ],
     "usual": {
      "low": {
       "text": "10 %",
       "value": 0.1
      },
      "high": {
       "text": "100 %",
       "value": 1
      }
     }
    },
    "quantum_efficiency": {
     "kind": "quantity",
     "description": "Ions in the upper level per absorbed pump photon.",
     "default": "1",
     "examples": [
      "0.95"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "above",
       "text": "0",
       "value": 0,
       "why": "without excited ions there is no pulse"
      },
      {
       "bound": "at least",
       "text": "1e-9",
       "value": 1e-9
      },
      {
       "bound": "at most",
       "text": "2",
       "value": 2,
       "why": "cross-relaxation gives at most two ions per photon"
      }
     ],
     "usual": {
      "low": {
       "text": "0.3",
       "value": 0.3
      },
      "high": {
       "text": "2",
       "value": 2
      }
     }
    },
    "beam": {
     "kind": "section",
     "description": "Pump beam in the medium.",
     "keys": {
      "profile": {
       "kind": "choice",
       "description": "Transverse profile: `flat` disc or `gaussian`.",
       "allowed": [
        "flat",
        "gaussian"
       ]
      },
      "radius": {
       "kind": "quantity",
       "description": "Disc radius of a flat profile, 1/e² intensity radius of a Gaussian one.",
       "examples": [
        "1.7 mm"
       ],
       "dimension": "length",
       "limits": [
        {
         "bound": "above",
         "text": "0 mm",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "10 nm",
         "value": 1e-8
        },
        {
         "bound": "at most",
         "text": "10 m",
         "value": 10
        }
       ],
       "usual": {
        "low": {
         "text": "5 um",
         "value": 0.000005
        },
        "high": {
         "text": "100 mm",
         "value": 0.1
        }
       }
      }
     },
     "required": [
      "profile",
      "radius"
     ]
    }
   },
   "required": [
    "kind",
    "wavelength",
    "absorbed_fraction",
    "beam"
   ]
  },
  "resonator": {
   "kind": "section",
   "description": "The linear resonator around the medium.",
   "keys": {
    "length": {
     "kind": "quantity",
     "description": "Mirror to mirror, mechanical; the media's indices are added to it.",
     "examples": [
      "180 mm"
     ],
     "dimension": "length",
     "limits": [
      {
       "bound": "above",
       "text": "0 mm",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 um",
       "value": 0.000001
      },
      {
       "bound": "at most",
       "text": "100 m",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "0.5 mm",
       "value": 0.0005
      },
      "high": {
       "text": "10 m",
       "value": 10
      }
     }
    },
    "output_reflectivity": {
     "kind": "quantity",
     "description": "Power reflectivity of the output coupler.",
     "examples": [
      "50 %"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "above",
       "text": "0 %",
       "value": 0,
       "why": "a coupler that reflects nothing makes no resonator"
      },
      {
       "bound": "at least",
       "text": "1e-7 %",
       "value": 1e-9
      },
      {
       "bound": "below",
       "text": "100 %",
       "value": 1,
       "why": "a coupler that reflects everything lets no light out"
      }
     ],
     "usual": {
      "low": {
       "text": "1 %",
       "value": 0.01
      },
      "high": {
       "text": "99.9 %",
       "value": 0.999
      }
     }
    },
    "round_trip_loss": {
     "kind": "quantity",
     "description": "Fraction lost per round trip with the switch open; all but the output coupler.",
     "examples": [
      "6 %"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "at least",
       "text": "0 %",
       "value": 0,
       "why": "a passive element adds no light"
      },
      {
       "bound": "below",
       "text": "100 %",
       "value": 1,
       "why": "a resonator that loses everything cannot lase"
      }
     ],
     "usual": {
      "low": {
       "text": "0.01 %",
       "value": 0.0001
      },
      "high": {
       "text": "70 %",
       "value": 0.7
      },
      "why": "no resonator is without loss, and the optimum coupling follows from it"
     }
    },
    "beam": {
     "kind": "section",
     "description": "The laser mode in the gain medium.",
     "keys": {
      "profile": {
       "kind": "choice",
       "description": "Transverse profile: `flat` disc or `gaussian`.",
       "allowed": [
        "flat",
        "gaussian"
       ]
      },
      "radius": {
       "kind": "quantity",
       "description": "Disc radius of a flat profile, 1/e² intensity radius of a Gaussian one.",
       "examples": [
        "1.7 mm"
       ],
       "dimension": "length",
       "limits": [
        {
         "bound": "above",
         "text": "0 mm",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "10 nm",
         "value": 1e-8
        },
        {
         "bound": "at most",
         "text": "10 m",
         "value": 10
        }
       ],
       "usual": {
        "low": {
         "text": "5 um",
         "value": 0.000005
        },
        "high": {
         "text": "100 mm",
         "value": 0.1
        }
       }
      }
     },
     "required": [
      "profile",
      "radius"
     ]
    }
   },
   "required": [
    "length",
    "output_reflectivity",
    "round_trip_loss",
    "beam"
   ]
  },
  "q_switch": {
   "kind": "section",
   "description": "What holds the resonator's loss up while ions are stored, and when it lets go.",
   "keys": {
    "kind": {
     "kind": "choice",
     "description": "`none` is gain switching: the pump alone makes the pulse.",
     "allowed": [
      "electro_optic",
      "acousto_optic",
      "rotating",
      "saturable_absorber",
      "none"
     ]
    },
    "closed_loss": {
     "kind": "quantity",
     "description": "Extra fraction lost per round trip while the switch is closed; a loss q per pass gives 1 − (1 − q)².",
     "default": "not given: hold-off is not judged",
     "examples": [
      "99.5 %"
     ],
     "dimension": "ratio",
     "limits": [
      {
       "bound": "above",
       "text": "0 %",
       "value": 0,
       "why": "a switch that blocks nothing is none; leave the key out if the loss is not known"
      },
      {
       "bound": "at least",
       "text": "1e-7 %",
       "value": 1e-9
      },
      {
       "bound": "below",
       "text": "100 %",
       "value": 1,
       "why": "no switch blocks completely; give the measured loss, or leave the key out"
      }
     ],
     "usual": {
      "low": {
       "text": "10 %",
       "value": 0.1
      },
      "high": {
       "text": "99.9999 %",
       "value": 0.999999
      }
     }
    },
    "opening_time": {
     "kind": "quantity",
     "description": "Full ramp of the transmission from closed to open.",
     "default": "instantaneous",
     "examples": [
      "5 ns"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "at least",
       "text": "0 ns",
       "value": 0
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "0 ns",
       "value": 0
      },
      "high": {
       "text": "100 us",
       "value": 0.0001
      }
     }
    },
    "opens_at": {
     "kind": "quantity",
     "description": "Opening after the pump's start.",
     "default": "the pump's end",
     "examples": [
      "200 us"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "above",
       "text": "0 us",
       "value": 0,
       "why": "before the pump starts nothing is stored"
      },
      {
       "bound": "at least",
       "text": "1 fs",
       "value": 1e-15
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "100 ns",
       "value": 1e-7
      },
      "high": {
       "text": "100 ms",
       "value": 0.1
      }
     }
    },
    "gate": {
     "kind": "quantity",
     "description": "How long the switch stays open.",
     "default": "half the period",
     "examples": [
      "10 us"
     ],
     "dimension": "time",
     "limits": [
      {
       "bound": "above",
       "text": "0 us",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1 fs",
       "value": 1e-15
      },
      {
       "bound": "at most",
       "text": "100 s",
       "value": 100
      }
     ],
     "usual": {
      "low": {
       "text": "10 ns",
       "value": 1e-8
      },
      "high": {
       "text": "100 ms",
       "value": 0.1
      }
     }
    },
    "repetition_rate": {
     "kind": "quantity",
     "description": "Rate of the openings; with a saturable absorber or none, of the pump pulses.",
     "examples": [
      "20 Hz"
     ],
     "dimension": "frequency",
     "limits": [
      {
       "bound": "above",
       "text": "0 Hz",
       "value": 0
      },
      {
       "bound": "at least",
       "text": "1e-6 Hz",
       "value": 0.000001
      },
      {
       "bound": "at most",
       "text": "1 GHz",
       "value": 1000000000
      }
     ],
     "usual": {
      "low": {
       "text": "0.01 Hz",
       "value": 0.01
      },
      "high": {
       "text": "1 MHz",
       "value": 1000000
      }
     }
    },
    "absorber": {
     "kind": "section",
     "description": "The saturable absorber of a passive switch.",
     "keys": {
      "material": {
       "kind": "text",
       "description": "A row of the property table, named by composition.",
       "examples": [
        "Cr4+:YAG"
       ]
      },
      "initial_transmission": {
       "kind": "quantity",
       "description": "Transmission of a single pass, unsaturated.",
       "examples": [
        "60 %"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0 %",
         "value": 0,
         "why": "an absorber that passes nothing never opens"
        },
        {
         "bound": "at least",
         "text": "1e-7 %",
         "value": 1e-9
        },
        {
         "bound": "below",
         "text": "100 %",
         "value": 1,
         "why": "an absorber that passes everything switches nothing"
        }
       ],
       "usual": {
        "low": {
         "text": "5 %",
         "value": 0.05
        },
        "high": {
         "text": "99 %",
         "value": 0.99
        }
       }
      },
      "ground_state_cross_section": {
       "kind": "quantity",
       "description": "Absorption cross-section of the ground state at the laser wavelength.",
       "default": "the property table's row for the absorber",
       "examples": [
        "4.3e-18 cm2"
       ],
       "dimension": "cross_section",
       "limits": [
        {
         "bound": "above",
         "text": "0 cm2",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 cm2",
         "value": 1e-34
        },
        {
         "bound": "at most",
         "text": "1e-10 cm2",
         "value": 1e-14
        }
       ],
       "usual": {
        "low": {
         "text": "1e-20 cm2",
         "value": 1e-24
        },
        "high": {
         "text": "1e-15 cm2",
         "value": 1e-19
        }
       }
      },
      "excited_state_cross_section": {
       "kind": "quantity",
       "description": "Absorption cross-section of the excited state: the loss that stays when the absorber is bleached.",
       "default": "the property table's row for the absorber",
       "examples": [
        "8.2e-19 cm2"
       ],
       "dimension": "cross_section",
       "limits": [
        {
         "bound": "at least",
         "text": "0 cm2",
         "value": 0
        },
        {
         "bound": "at most",
         "text": "1e-10 cm2",
         "value": 1e-14
        }
       ],
       "usual": {
        "low": {
         "text": "0 cm2",
         "value": 0
        },
        "high": {
         "text": "1e-16 cm2",
         "value": 1e-20
        }
       }
      },
      "lifetime": {
       "kind": "quantity",
       "description": "Recovery time of the absorber.",
       "default": "the property table's row for the absorber",
       "examples": [
        "3.4 us"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 us",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1 fs",
         "value": 1e-15
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ],
       "usual": {
        "low": {
         "text": "1 ps",
         "value": 1e-12
        },
        "high": {
         "text": "1 ms",
         "value": 0.001
        }
       }
      },
      "beam_radius": {
       "kind": "quantity",
       "description": "Radius of the laser mode in the absorber, of the same profile as in the medium.",
       "default": "the mode radius in the medium",
       "examples": [
        "0.9 mm"
       ],
       "dimension": "length",
       "limits": [
        {
         "bound": "above",
         "text": "0 mm",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "10 nm",
         "value": 1e-8
        },
        {
         "bound": "at most",
         "text": "10 m",
         "value": 10
        }
       ],
       "usual": {
        "low": {
         "text": "5 um",
         "value": 0.000005
        },
        "high": {
         "text": "100 mm",
         "value": 0.1
        }
       }
      },
      "length": {
       "kind": "quantity",
       "description": "Length of the absorber along the beam.",
       "default": "0: it adds nothing to the round-trip time",
       "examples": [
        "3 mm"
       ],
       "dimension": "length",
       "limits": [
        {
         "bound": "at least",
         "text": "0 mm",
         "value": 0
        },
        {
         "bound": "at most",
         "text": "100 m",
         "value": 100
        }
       ],
       "usual": {
        "low": {
         "text": "0 mm",
         "value": 0
        },
        "high": {
         "text": "100 mm",
         "value": 0.1
        }
       }
      },
      "refractive_index": {
       "kind": "quantity",
       "description": "Refractive index of the absorber.",
       "default": "the property table's row for the absorber",
       "examples": [
        "1.82"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "at least",
         "text": "1",
         "value": 1,
         "why": "light in the absorber is no faster than in vacuum"
        },
        {
         "bound": "at most",
         "text": "5",
         "value": 5
        }
       ],
       "usual": {
        "low": {
         "text": "1.3",
         "value": 1.3
        },
        "high": {
         "text": "4",
         "value": 4
        }
       }
      }
     },
     "required": [
      "material",
      "initial_transmission"
     ]
    }
   },
   "required": [
    "kind",
    "repetition_rate"
   ]
  },
  "surfaces": {
   "kind": "list",
   "description": "Surfaces and coatings that the beam meets, each judged against its damage threshold.",
   "item": {
    "kind": "section",
    "description": "One surface.",
    "keys": {
     "name": {
      "kind": "text",
      "description": "What the surface is called in problems and in the readout.",
      "examples": [
       "output coupler, inner face"
      ]
     },
     "place": {
      "kind": "choice",
      "description": "`inside` the resonator (circulating light) or `outside` it (the output pulse).",
      "allowed": [
       "inside",
       "outside"
      ]
     },
     "face": {
      "kind": "choice",
      "description": "`transmitting`: crossed in both directions; `reflecting`: a mirror, judged by the incident fluence.",
      "default": "transmitting",
      "allowed": [
       "transmitting",
       "reflecting"
      ]
     },
     "beam_radius": {
      "kind": "quantity",
      "description": "Beam radius at the surface, of the mode's profile.",
      "examples": [
       "0.9 mm"
      ],
      "dimension": "length",
      "limits": [
       {
        "bound": "above",
        "text": "0 mm",
        "value": 0
       },
       {
        "bound": "at least",
        "text": "10 nm",
        "value": 1e-8
       },
       {
        "bound": "at most",
        "text": "10 m",
        "value": 10
       }
      ],
      "usual": {
       "low": {
        "text": "5 um",
        "value": 0.000005
       },
       "high": {
        "text": "100 mm",
        "value": 0.1
       }
      }
     },
     "damage_threshold": {
      "kind": "section",
      "description": "Measured damage threshold, with the pulse it was measured with.",
      "keys": {
       "fluence": {
        "kind": "quantity",
        "description": "Peak fluence of the laser-induced damage threshold (ISO 21254), at normal incidence unless the test says otherwise.",
        "examples": [
         "10 J/cm2"
        ],
        "dimension": "fluence",
        "limits": [
         {
          "bound": "above",
          "text": "0 J/cm2",
          "value": 0
         },
         {
          "bound": "at least",
          "text": "1e-9 J/cm2",
          "value": 0.00001
         },
         {
          "bound": "at most",
          "text": "1e6 J/cm2",
          "value": 10000000000
         }
        ],
        "usual": {
         "low": {
          "text": "0.05 J/cm2",
          "value": 500
         },
         "high": {
          "text": "200 J/cm2",
          "value": 2000000
         }
        }
       },
       "pulse_width": {
        "kind": "quantity",
        "description": "Full width at half maximum of the test's pulses.",
        "examples": [
         "10 ns"
        ],
        "dimension": "time",
        "limits": [
         {
          "bound": "above",
          "text": "0 ns",
          "value": 0
         },
         {
          "bound": "at least",
          "text": "1 fs",
          "value": 1e-15
         },
         {
          "bound": "at most",
          "text": "1 s",
          "value": 1
         }
        ],
        "usual": {
         "low": {
          "text": "1 ps",
          "value": 1e-12
         },
         "high": {
          "text": "1 us",
          "value": 0.000001
         }
        }
       },
       "wavelength": {
        "kind": "quantity",
        "description": "Wavelength of the test. Thresholds are not scaled across wavelengths.",
        "examples": [
         "1064 nm"
        ],
        "dimension": "length",
        "limits": [
         {
          "bound": "above",
          "text": "0 nm",
          "value": 0
         },
         {
          "bound": "at least",
          "text": "100 nm",
          "value": 1e-7
         },
         {
          "bound": "at most",
          "text": "20 um",
          "value": 0.00002
         }
        ],
        "usual": {
         "low": {
          "text": "200 nm",
          "value": 2e-7
         },
         "high": {
          "text": "11 um",
          "value": 0.000011
         }
        }
       }
      },
      "required": [
       "fluence",
       "pulse_width",
       "wavelength"
      ]
     },
     "hot_spot_factor": {
      "kind": "quantity",
      "description": "Peak fluence of the real beam over that of its smooth profile.",
      "default": "1",
      "examples": [
       "1.5"
      ],
      "dimension": "ratio",
      "limits": [
       {
        "bound": "at least",
        "text": "1",
        "value": 1,
        "why": "a hot spot is at least as bright as the smooth beam"
       },
       {
        "bound": "at most",
        "text": "1000",
        "value": 1000
       }
      ],
      "usual": {
       "low": {
        "text": "1",
        "value": 1
       },
       "high": {
        "text": "5",
        "value": 5
       }
      }
     },
     "safety_factor": {
      "kind": "quantity",
      "description": "Margin wanted between threshold and fluence; below it a warning is given.",
      "default": "1",
      "examples": [
       "2"
      ],
      "dimension": "ratio",
      "limits": [
       {
        "bound": "at least",
        "text": "1",
        "value": 1,
        "why": "a margin below 1 is damage"
       },
       {
        "bound": "at most",
        "text": "1000",
        "value": 1000
       }
      ],
      "usual": {
       "low": {
        "text": "1",
        "value": 1
       },
       "high": {
        "text": "10",
        "value": 10
       }
      }
     }
    },
    "required": [
     "name",
     "place",
     "beam_radius",
     "damage_threshold"
    ]
   }
  },
  "requirements": {
   "kind": "section",
   "description": "What the pulse must be. Each figure takes `min`, `max` or both.",
   "keys": {
    "pulse_energy": {
     "kind": "section",
     "description": "Energy of a pulse in the settled train.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "8 mJ"
       ],
       "dimension": "energy",
       "limits": [
        {
         "bound": "above",
         "text": "0 J",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 J",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GJ",
         "value": 1000000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "14 mJ"
       ],
       "dimension": "energy",
       "limits": [
        {
         "bound": "above",
         "text": "0 J",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 J",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GJ",
         "value": 1000000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "pulse_width": {
     "kind": "section",
     "description": "Full width at half maximum of the pulse.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "2 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "12 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "peak_power": {
     "kind": "section",
     "description": "Peak power of the pulse.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "0.7 MW"
       ],
       "dimension": "power",
       "limits": [
        {
         "bound": "above",
         "text": "0 W",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 W",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e18 W",
         "value": 1000000000000000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "2 MW"
       ],
       "dimension": "power",
       "limits": [
        {
         "bound": "above",
         "text": "0 W",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 W",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e18 W",
         "value": 1000000000000000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "average_power": {
     "kind": "section",
     "description": "Pulse energy times pulses per second.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "0.7 MW"
       ],
       "dimension": "power",
       "limits": [
        {
         "bound": "above",
         "text": "0 W",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 W",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e18 W",
         "value": 1000000000000000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "2 MW"
       ],
       "dimension": "power",
       "limits": [
        {
         "bound": "above",
         "text": "0 W",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 W",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e18 W",
         "value": 1000000000000000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "repetition_rate": {
     "kind": "section",
     "description": "Pulses per second.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "19 Hz"
       ],
       "dimension": "frequency",
       "limits": [
        {
         "bound": "above",
         "text": "0 Hz",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 Hz",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GHz",
         "value": 1000000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "21 Hz"
       ],
       "dimension": "frequency",
       "limits": [
        {
         "bound": "above",
         "text": "0 Hz",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 Hz",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GHz",
         "value": 1000000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "build_up_time": {
     "kind": "section",
     "description": "From the first instant of opening to the pulse's peak.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "2 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "12 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "first_pulse_energy": {
     "kind": "section",
     "description": "Energy of the first pulse after a cold start.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "8 mJ"
       ],
       "dimension": "energy",
       "limits": [
        {
         "bound": "above",
         "text": "0 J",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 J",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GJ",
         "value": 1000000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "14 mJ"
       ],
       "dimension": "energy",
       "limits": [
        {
         "bound": "above",
         "text": "0 J",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 J",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1 GJ",
         "value": 1000000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "hold_off_margin": {
     "kind": "section",
     "description": "Loss of the closed resonator over the gain it must hold, both logarithmic.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "1.2"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e6",
         "value": 1000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "5"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e6",
         "value": 1000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "timing_jitter": {
     "kind": "section",
     "description": "Standard deviation of the pulse's timing against the trigger.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "2 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "12 ns"
       ],
       "dimension": "time",
       "limits": [
        {
         "bound": "above",
         "text": "0 s",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 s",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "100 s",
         "value": 100
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "energy_stability": {
     "kind": "section",
     "description": "Standard deviation of the pulse energy over its mean.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "1.2"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e6",
         "value": 1000000
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "5"
       ],
       "dimension": "ratio",
       "limits": [
        {
         "bound": "above",
         "text": "0",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30",
         "value": 1e-30
        },
        {
         "bound": "at most",
         "text": "1e6",
         "value": 1000000
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    },
    "divergence": {
     "kind": "section",
     "description": "Full divergence angle of the output beam at 1/e² of its peak.",
     "keys": {
      "min": {
       "kind": "quantity",
       "description": "The least that will do.",
       "examples": [
        "0.5 mrad"
       ],
       "dimension": "angle",
       "limits": [
        {
         "bound": "above",
         "text": "0 mrad",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 mrad",
         "value": 1e-33
        },
        {
         "bound": "at most",
         "text": "3 rad",
         "value": 3
        }
       ]
      },
      "max": {
       "kind": "quantity",
       "description": "The most that will do.",
       "examples": [
        "2 mrad"
       ],
       "dimension": "angle",
       "limits": [
        {
         "bound": "above",
         "text": "0 mrad",
         "value": 0
        },
        {
         "bound": "at least",
         "text": "1e-30 mrad",
         "value": 1e-33
        },
        {
         "bound": "at most",
         "text": "3 rad",
         "value": 3
        }
       ]
      }
     },
     "required": [],
     "order": {
      "lower": "min",
      "upper": "max",
      "strict": false,
      "because": "nothing lies between them"
     }
    }
   },
   "required": []
  }
 },
 "required": [
  "format",
  "gain_medium",
  "pump",
  "resonator",
  "q_switch"
 ]
};

/** By JSON pointer into the schema. */
export const CONDITIONS: Readonly<Record<string, Condition>> = {
 "#/properties/gain_medium/allOf/0/then/properties/inversion_reduction_factor": {
  "because": "`lower_level_lifetime` already says how the lower level empties"
 },
 "#/properties/pump/allOf/0/then": {
  "because": "a pulsed pump needs its duration",
  "blame": "kind"
 },
 "#/properties/pump/allOf/1/then/properties/duration": {
  "because": "a continuous pump has no duration",
  "blame": "kind"
 },
 "#/properties/pump/allOf/2/then/properties/power": {
  "because": "`diode` already gives the pump's power"
 },
 "#/properties/pump/allOf/2/else": {
  "because": "give the power that reaches the medium, or a `diode` block that it follows from"
 },
 "#/properties/q_switch/allOf/0/then": {
  "because": "a saturable absorber needs its block",
  "blame": "kind"
 },
 "#/properties/q_switch/allOf/1/then/properties/absorber": {
  "because": "only `kind: saturable_absorber` has one",
  "blame": "kind"
 },
 "#/properties/q_switch/allOf/2/then/properties/closed_loss": {
  "because": "only a driven switch has this",
  "blame": "kind"
 },
 "#/properties/q_switch/allOf/2/then/properties/opening_time": {
  "because": "only a driven switch has this",
  "blame": "kind"
 },
 "#/properties/q_switch/allOf/2/then/properties/opens_at": {
  "because": "only a driven switch has this",
  "blame": "kind"
 },
 "#/properties/q_switch/allOf/2/then/properties/gate": {
  "because": "only a driven switch has this",
  "blame": "kind"
 }
};
