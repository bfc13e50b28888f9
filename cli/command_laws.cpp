#include "gainsay/cli/command_laws.h"

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/laws_text.h"
#include "gainsay/cli/table_text.h"
#include "gainsay/core/nearest_name.h"
#include "gainsay/core/rate_laws.h"

#include <vector>

namespace gainsay::cli {
namespace {

std::string all_laws(const LawsOptions& options) {
  if (options.markdown) return rate_laws_page();
  if (options.json) return laws_as_json();
  return list_of_laws() + "\n'gainsay laws NAME' explains one.\n";
}

std::string one_law(const LawsOptions& options, const core::RateLaw& law) {
  if (options.markdown) return law_as_markdown(law);
  return options.json ? law_as_json(law) : explanation(law);
}

core::Failure no_such_law(const std::string& name) {
  std::vector<std::string> known;
  for (const core::RateLaw& law : core::all_rate_laws()) known.push_back(law.name);
  const auto nearest = core::nearest_name(name, known);
  return {.what = "there is no rate law '" + harmless(name) + "'",
          .expected = "the name of a rate law" +
                      (nearest ? "; nearest known name: '" + *nearest + "'" : std::string()),
          .to_do = "correct the name; 'gainsay laws' lists them",
          .place = {}};
}

}  // namespace

int run_laws(const LawsOptions& options, const Console& console) {
  if (!options.name) {
    console.out << all_laws(options);
    return kDone;
  }
  const core::RateLaw* law = core::find_rate_law(*options.name);
  if (law == nullptr) {
    print_failure(console, no_such_law(*options.name));
    return kWrongInput;
  }
  console.out << one_law(options, *law);
  return kDone;
}

}  // namespace gainsay::cli
