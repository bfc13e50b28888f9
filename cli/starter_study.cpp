#include "gainsay/cli/starter_study.h"

#include <string_view>

namespace gainsay::cli {

namespace {

constexpr std::string_view kStudy =
    R"file(# A study asks one question. This one is small and judges as it is: gainsay judge
# Change it piece by piece; `gainsay check` says what is understood and what is wrong.
# Its readings are invented. Every key: docs/study-files.md
title = "How does the dye fade?"

# What the instruments show. `shows` is an expression of whatever has a name in the hypotheses.
# noise: the standard deviation of one reading, in the unit of the readout. Is it not known, write
# noise = { sd = "unknown" }.
[readouts]
dye    = { shows = "dye", unit = "mmol/L", noise = { sd = 0.08 } }
signal = { shows = "product", scale = "unknown", offset = "unknown", noise = { sd = 0.04 } }

# Numbers to be fitted, each with the range in which it may lie. All hypotheses share the range;
# each finds its own value.
[unknowns]
k = { between = [1e-4, 10], unit = "as the rate needs" }

# Numbers that are given belong under [knowns], what the experimenter changes over time under
# [inputs].
)file";

constexpr std::string_view kFirstOrder =
    R"file(# One file for each hypothesis: what is there, and what turns it into what.
title = "First order"

# In expressions a species is its concentration. It starts at 0 unless said here or by the
# experiment.
[species]
dye     = {}
product = {}

# `rate` is concentration per time. mass_action(k) is k times the reactants of the equation;
# `gainsay laws` lists the other rate laws, and any expression may stand in their place.
[reactions]
fading = { equation = "dye -> product", rate = "mass_action(k)" }
)file";

constexpr std::string_view kSecondOrder =
    R"file(# A rival is written as an amendment of another hypothesis: keys that stand here are added or
# replaced, and remove = ["reactions.fading"] would take something out.
base  = "first-order.toml"
title = "Second order"
reactions.fading = { equation = "2 dye -> 2 product", rate = "mass_action(k)" }
)file";

constexpr std::string_view kReversible =
    R"file(# A reversible reaction has `<->` in its equation, `rate` forward and `back` backward. An unknown
# of this hypothesis alone stands here.
base  = "first-order.toml"
title = "Reversible"
reactions.fading = { equation = "dye <-> product", rate = "k * dye", back = "k_back * product" }
unknowns.k_back  = [1e-5, 10]
)file";

constexpr std::string_view kStrong =
    R"file(# One file for each run, its readings beside it in the CSV of the same name.
title = "Strong solution"
start = { dye = 10 }
)file";

constexpr std::string_view kWeak = R"file(title = "Weak solution"
start = { dye = 3 }
)file";

constexpr std::string_view kStrongTable = R"file(time,dye,signal
1,8.97,0.562
2,7.88,0.861
4,6.18,1.591
6,5.00,1.951
8,3.79,2.349
10,2.80,2.713
13,2.16,2.986
16,1.55,3.173
20,0.93,3.416
25,0.56,3.506
)file";

constexpr std::string_view kWeakTable = R"file(time,dye,signal
1,2.56,0.344
2,2.39,0.380
4,1.95,0.626
6,1.50,0.743
8,1.19,0.905
10,0.88,0.994
13,0.65,1.046
16,0.56,1.105
20,0.31,1.133
25,0.15,1.204
)file";

}  // namespace

std::map<std::string, std::map<std::string, std::string>> starter_study() {
  return {{"", {{"study.toml", std::string(kStudy)}}},
          {"hypotheses",
           {{"first-order.toml", std::string(kFirstOrder)},
            {"second-order.toml", std::string(kSecondOrder)},
            {"reversible.toml", std::string(kReversible)}}},
          {"experiments",
           {{"strong.toml", std::string(kStrong)},
            {"strong.csv", std::string(kStrongTable)},
            {"weak.toml", std::string(kWeak)},
            {"weak.csv", std::string(kWeakTable)}}}};
}

}  // namespace gainsay::cli
