#include "gainsay/cli/command_equations.h"

#include "gainsay/cli/equations.h"
#include "gainsay/cli/find.h"
#include "gainsay/cli/judging.h"
#include "gainsay/cli/study_reader.h"

#include <cstddef>
#include <vector>

namespace gainsay::cli {
namespace {

using core::Result;

/// Numbers of the hypotheses asked for.
Result<std::vector<std::size_t>> chosen(const EquationsOptions& options, const Study& study) {
  std::vector<std::size_t> numbers;
  if (options.hypothesis) {
    const auto number = find_hypothesis(study, *options.hypothesis);
    if (!number) return number.failure();
    numbers.push_back(*number);
  } else {
    for (std::size_t i = 0; i < study.hypotheses.size(); ++i) numbers.push_back(i);
  }
  return numbers;
}

/// As for simulating: with every readout, whether there are data of it yet or not.
Result<estimation::Problem> put_together(const Study& study, std::size_t number) {
  if (!study.experiments.empty()) return assemble_problem(study, number, Purpose::Simulate);
  Study planned = study;
  planned.experiments.emplace_back();
  return assemble_problem(planned, number, Purpose::Simulate);
}

Result<std::vector<StateSpace>> forms_of(const EquationsOptions& options, const Study& study) {
  const auto numbers = chosen(options, study);
  if (!numbers) return numbers.failure();
  std::vector<StateSpace> forms;
  for (const std::size_t number : *numbers) {
    const auto problem = put_together(study, number);
    if (!problem) return problem.failure();
    forms.push_back(state_space(study, number, *problem));
  }
  return forms;
}

std::string written(const std::vector<StateSpace>& forms, const Study& study, EquationsForm form) {
  if (form == EquationsForm::Latex) return equations_latex_document(forms, study.title);
  if (form == EquationsForm::Html) return equations_html_page(forms, study.title);
  std::string text;
  for (const auto& each : forms) text += (text.empty() ? "" : "\n\n") + equations_text(each);
  return text;
}

}  // namespace

int run_equations(const EquationsOptions& options, const Console& console) {
  const StudyReading reading = read_study(options.study, ReadFor::Looking);
  print(console.messages, reading.diagnostics, console.colour);
  if (!reading.study) return kWrongInput;
  const auto forms = forms_of(options, *reading.study);
  if (!forms) {
    print_failure(console, forms.failure());
    return kWrongInput;
  }
  console.out << written(*forms, *reading.study, options.form);
  return kDone;
}

}  // namespace gainsay::cli
