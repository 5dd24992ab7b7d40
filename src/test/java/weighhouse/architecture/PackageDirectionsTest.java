package weighhouse.architecture;

import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption.DoNotIncludeTests;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Data flows one way through the packages; so do their dependencies. */
@AnalyzeClasses(packages = "weighhouse", importOptions = DoNotIncludeTests.class)
class PackageDirectionsTest {

  @ArchTest
  static final ArchRule DEPENDENCIES_POINT_ONE_WAY =
      layeredArchitecture()
          .consideringOnlyDependenciesInLayers()
          .withOptionalLayers(true)
          .layer("workbook")
          .definedBy("weighhouse.workbook..")
          .layer("formula")
          .definedBy("weighhouse.formula..")
          .layer("effect")
          .definedBy("weighhouse.effect..")
          .layer("quantity")
          .definedBy("weighhouse.quantity..")
          .layer("recalculate")
          .definedBy("weighhouse.recalculate..")
          .layer("rules")
          .definedBy("weighhouse.rules..")
          .layer("audit")
          .definedBy("weighhouse.audit..")
          .layer("report")
          .definedBy("weighhouse.report..")
          .layer("cli")
          .definedBy("weighhouse.cli..")
          .whereLayer("workbook")
          .mayNotAccessAnyLayer()
          .whereLayer("formula")
          .mayOnlyAccessLayers("workbook")
          .whereLayer("effect")
          .mayNotAccessAnyLayer()
          .whereLayer("quantity")
          .mayOnlyAccessLayers("workbook", "formula", "effect")
          .whereLayer("recalculate")
          .mayOnlyAccessLayers("workbook", "formula", "effect")
          .whereLayer("rules")
          .mayOnlyAccessLayers("workbook", "formula", "effect", "quantity", "recalculate")
          .whereLayer("audit")
          .mayOnlyAccessLayers("workbook", "formula", "effect", "quantity", "recalculate", "rules")
          .whereLayer("report")
          .mayOnlyAccessLayers("workbook", "formula", "effect", "quantity", "audit")
          .whereLayer("cli")
          .mayOnlyAccessLayers("workbook", "quantity", "rules", "audit", "report");

  @ArchTest
  static final ArchRule NO_TWO_PACKAGES_NEED_EACH_OTHER =
      slices().matching("weighhouse.(**)").should().beFreeOfCycles();
}
