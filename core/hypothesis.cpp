#include "gainsay/core/hypothesis.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <set>

namespace gainsay::core {
namespace {

using Meanings = std::map<std::string, Expression, std::less<>>;

/// What each name that is not elementary stands for, as written.
Meanings meanings(const Hypothesis& hypothesis) {
  Meanings all;
  for (const auto& compartment : hypothesis.compartments)
    all.emplace(compartment.name, compartment.volume);
  for (const auto& reaction : hypothesis.reactions) all.emplace(reaction.name, net(reaction));
  for (const auto& definition : hypothesis.definitions)
    all.emplace(definition.name, definition.meaning);
  return all;
}

/// Writes names out depth first, each once.
class Writer {
 public:
  explicit Writer(Meanings as_written) : as_written_(std::move(as_written)) {}

  Expression write_out(const Expression& expression) {
    Meanings replacements;
    for (const auto& name : symbols(expression))
      if (as_written_.contains(name)) replacements.emplace(name, meaning(name));
    return replacements.empty() ? expression : substitute(expression, replacements);
  }

 private:
  const Expression& meaning(const std::string& name) {
    if (const auto known = written_.find(name); known != written_.end()) return known->second;
    GAINSAY_REQUIRE(open_.insert(name).second, "the name '" + name + "' does not lead to itself");
    Expression content = write_out(as_written_.find(name)->second);
    open_.erase(name);
    return written_.emplace(name, std::move(content)).first->second;
  }

  Meanings as_written_;
  Meanings written_;
  std::set<std::string, std::less<>> open_;  ///< names on the way to the one being written out
};

/// Depth-first search for a way back to a name that is still open.
class CircleSearch {
 public:
  explicit CircleSearch(const std::vector<Definition>& definitions) {
    for (const auto& definition : definitions)
      meanings_.emplace(definition.name, &definition.meaning);
  }

  bool found_from(const std::string& name) {
    if (const auto begin = std::find(way_.begin(), way_.end(), name); begin != way_.end()) {
      way_.erase(way_.begin(), begin);
      return true;
    }
    const auto meaning = meanings_.find(name);
    if (meaning == meanings_.end() || !visited_.insert(name).second) return false;
    way_.push_back(name);
    for (const auto& next : symbols(*meaning->second))
      if (found_from(next)) return true;
    way_.pop_back();
    return false;
  }

  const std::vector<std::string>& way() const { return way_; }

 private:
  std::map<std::string, const Expression*, std::less<>> meanings_;
  std::set<std::string, std::less<>> visited_;
  std::vector<std::string> way_;
};

}  // namespace

std::optional<std::size_t> find_species(const Hypothesis& hypothesis, std::string_view name) {
  const auto found = std::find_if(hypothesis.species.begin(), hypothesis.species.end(),
                                  [&](const Species& species) { return species.name == name; });
  if (found == hypothesis.species.end()) return std::nullopt;
  return static_cast<std::size_t>(found - hypothesis.species.begin());
}

Expression net(const Reaction& reaction) {
  return reaction.back ? reaction.forward - *reaction.back : reaction.forward;
}

Expression written_out(const Expression& expression, const Hypothesis& hypothesis) {
  return Writer(meanings(hypothesis)).write_out(expression);
}

std::vector<Expression> written_out(const std::vector<Expression>& expressions,
                                    const Hypothesis& hypothesis) {
  Writer writer(meanings(hypothesis));
  std::vector<Expression> all;
  all.reserve(expressions.size());
  for (const auto& expression : expressions) all.push_back(writer.write_out(expression));
  return all;
}

std::vector<std::string> circle(const std::vector<Definition>& definitions) {
  CircleSearch search(definitions);
  for (const auto& definition : definitions)
    if (search.found_from(definition.name)) return search.way();
  return {};
}

}  // namespace gainsay::core
